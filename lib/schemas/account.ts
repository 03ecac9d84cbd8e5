import { z } from 'zod';
import { nameField } from '@/lib/schemas/number-field';

export const emailField = z
  .string({ error: 'E-mail: give an address.' })
  .trim()
  .max(254, { error: 'E-mail: at most 254 characters.' })
  .pipe(z.email({ error: 'E-mail: give an address such as name@example.org.' }));

export const personNameField = nameField('Name', 80);
export const tokenNameField = nameField('Name of the token', 60);

const givenPassword = z.string({ error: 'Password: give it.' }).min(1, { error: 'Password: give it.' }).max(1000);

export const registrationSchema = z.object({ email: emailField, name: personNameField });

export const signInSchema = z.object({ email: emailField, password: givenPassword });
export const resetRequestSchema = z.object({ email: emailField });
/** The rule that the password is not the e-mail needs the account, and is checked with it. */
export const newPasswordSchema = z.object({ token: z.string().max(200), password: z.string() });
export const passwordChangeSchema = z.object({ currentPassword: givenPassword, newPassword: z.string() });
export const personNameSchema = z.object({ name: personNameField });
export const tokenNameSchema = z.object({ name: tokenNameField });
