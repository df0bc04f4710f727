import { z } from 'zod';

/** Long passwords that turn up first in every list of stolen ones. */
const tooCommon = new Set([
  'passwordpassword',
  'password1234',
  'password12345',
  'password123456',
  '123456789012',
  '1234567890123',
  '123456123456',
  '111111111111',
  '000000000000',
  'qwertyuiop12',
  'qwertyuiop123',
  'qwertyqwerty',
  'qwerty123456',
  'abcdefghijkl',
  'abcdef123456',
  'iloveyou1234',
  'letmeinletmein',
  'welcome12345',
  'administrator',
  'changemechangeme',
  'aaaaaaaaaaaa',
  'asdfghjkl123',
  'tubeplatetubeplate',
  'steamsteamsteam',
]);

export const shortestPassword = 12;
export const longestPassword = 128;

/** A new password: long enough, not one that everybody tries. Spaces and any letters are welcome. */
export const newPassword = z
  .string()
  .min(shortestPassword, `Use at least ${String(shortestPassword)} characters; a few words in a row do well`)
  .max(longestPassword, `Use at most ${String(longestPassword)} characters`)
  .refine(
    (text) => !tooCommon.has(text.toLowerCase()) && new Set(text).size > 3,
    'That password is on every list of common ones',
  );
