import { ref, string } from 'yup';

/** The shortest password that may be chosen; length does more than odd characters. */
export const shortestPassword = 10;

export const newPassword = string()
  .required('Choose a password.')
  .min(shortestPassword, `At least ${shortestPassword} characters; a few words are fine.`)
  // bcrypt reads no further than 72 bytes, so a longer one would promise more than it keeps.
  .test(
    'bytes',
    'Too long: no more than 72 bytes count.',
    (value) => new TextEncoder().encode(value).length <= 72,
  );

export const repeatedPassword = string()
  .required('Enter it once more.')
  .oneOf([ref('password')], 'The two entries differ.');
