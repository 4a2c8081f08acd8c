import { createHash, randomBytes } from 'node:crypto';

/** 256 random bits that lead somewhere without a password. Only the hash is stored: who reads the database cannot use it. */
export const newToken = (): string => randomBytes(32).toString('base64url');

export const tokenHash = (token: string): string => createHash('sha256').update(token).digest('hex');
