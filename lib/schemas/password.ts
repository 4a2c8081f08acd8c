import { z } from 'zod';
import { commonPasswords } from './common-passwords';

const isRun = (text: string): boolean => {
  const steps = new Set([...text].slice(1).map((sign, index) => sign.charCodeAt(0) - text.charCodeAt(index)));
  return steps.size === 1 && [-1, 0, 1].includes([...steps][0] ?? 9);
};

/** A password that guessing programs try first: on our list, one sign repeated, or a run such as 12345678. */
export function isCommonPassword(password: string): boolean {
  const plain = password.trim().toLowerCase();
  const word = plain.replace(/^[^a-z]+|[^a-z]+$/g, '');
  return commonPasswords.has(plain) || commonPasswords.has(word) || isRun(plain) || isRun(plain.slice(0, 8));
}

/** At least 8 characters, 15 advised; every character is allowed and none is demanded. */
export const newPassword = z
  .string('The password is missing.')
  .min(8, 'At least 8 characters; 15 or more are better, four plain words for instance.')
  .max(256, 'At most 256 characters.')
  .refine(
    (password) => !isCommonPassword(password),
    'This password is among the first that are guessed. Take another.',
  );
