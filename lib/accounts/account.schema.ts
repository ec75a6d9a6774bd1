import { z } from 'zod';
import { NOT_ONE_LINE, ONE_LINE } from '../format/one-line';

export const PASSPHRASE_LEAST = 15;
export const PASSPHRASE_MOST = 256;

export const emailField = z
  .string({ error: 'Type your e-mail address.' })
  .trim()
  .max(254, 'An e-mail address has at most 254 characters.')
  .regex(
    /^[^\s"(),:;<>@[\\\]]+@[^\s"(),:;<>@[\\\]]+\.[^\s"(),:;<>@[\\\]]+$/,
    'Type an address such as name@garden.example.',
  );

/** Spaces count, nothing else is asked; a list of common ones is checked on the server. */
export const passphraseField = z
  .string({ error: 'Type a passphrase.' })
  .min(PASSPHRASE_LEAST, { error: (issue) => missingLetters(String(issue.input ?? '').length) })
  .max(PASSPHRASE_MOST, `At most ${PASSPHRASE_MOST} characters.`);

export function missingLetters(length: number): string {
  const missing = PASSPHRASE_LEAST - length;
  if (length === 0) return `At least ${PASSPHRASE_LEAST} characters: four words will do.`;
  return `${missing} ${missing === 1 ? 'character' : 'characters'} more.${missing < 9 ? ' One further word will do.' : ''}`;
}

export const displayNameField = z
  .string({ error: 'Type the name that others should see.' })
  .trim()
  .min(1, 'Type the name that others should see.')
  .max(80, 'At most 80 characters.')
  .regex(ONE_LINE, NOT_ONE_LINE);

export const unitSystemField = z.enum(['metric', 'us'], { error: 'Choose metric or US units.' });
export const themeField = z.enum(['system', 'limewash', 'cellar'], { error: 'Choose one of the three.' });

export const signUpSchema = z.strictObject({
  displayName: displayNameField,
  email: emailField,
  password: passphraseField,
  unitSystem: unitSystemField.default('metric'),
});
export type SignUp = z.input<typeof signUpSchema>;

export const accountChangeSchema = z.strictObject({
  displayName: displayNameField.optional(),
  unitSystem: unitSystemField.optional(),
  theme: themeField.optional(),
});
export type AccountChange = z.infer<typeof accountChangeSchema>;

export const passwordChangeSchema = z.strictObject({
  current: z
    .string({ error: 'Type your present passphrase.' })
    .min(1, 'Type your present passphrase.')
    .max(PASSPHRASE_MOST),
  next: passphraseField,
});
export type PasswordChange = z.infer<typeof passwordChangeSchema>;

export interface Account {
  accountId: string;
  email: string;
  displayName: string;
  unitSystem: z.infer<typeof unitSystemField>;
  theme: z.infer<typeof themeField>;
}
