import { z } from 'zod';
import { type Role, roles } from '@/lib/auth/permissions';
import { id, line, optionalText } from './common';
import { newPassword } from './password';

export const roleWords: Record<Role, { name: string; does: string }> = {
  administrator: { name: 'administrator', does: 'people, letterhead, catalogue' },
  reviewer: { name: 'reviewer', does: 'checks jobs and issues reports' },
  inspector: { name: 'inspector', does: 'measures at the machine' },
  customer: { name: 'customer', does: 'reads and signs the reports of the own machines' },
};

export const email = z.string().trim().toLowerCase().pipe(z.email('This is not an e-mail address.').max(320));

const heldRoles = z
  .array(z.enum(roles), 'Choose at least one role.')
  .min(1, 'Choose at least one role.')
  .refine((held) => !held.includes('customer') || held.length === 1, 'A customer has no other role.');

/** Somebody is asked to join; a customer's person is tied to the customer. */
export const invitation = z
  .object({ email, name: line('The name', 120), roles: heldRoles, customerId: z.union([z.literal(''), id]).nullish() })
  .transform((value) => ({ ...value, customerId: value.customerId || null }))
  .refine((value) => value.roles.includes('customer') === (value.customerId !== null), {
    path: ['customerId'],
    error: 'A customer’s person belongs to a customer, everybody else to none.',
  });
export type Invitation = z.output<typeof invitation>;

export const memberChange = z
  .strictObject({
    name: line('The name', 120),
    functionTitle: optionalText('The function', 120),
    roles: heldRoles,
    disabled: z.boolean(),
  })
  .partial();
export type MemberChange = z.output<typeof memberChange>;

/** `password` is a new one, or the own one when the address has an account already. */
export const acceptance = z.strictObject({
  token: z.string().min(20).max(200),
  name: line('Your name', 120),
  functionTitle: optionalText('Your function', 120),
  password: newPassword,
});

export const acceptanceWithAccount = acceptance.extend({
  password: z.string().min(1, 'The password is missing.').max(1000),
});
