import { betterAuth } from 'better-auth';
import { drizzleAdapter } from 'better-auth/adapters/drizzle';
import { APIError, createAuthMiddleware } from 'better-auth/api';
import { twoFactor } from 'better-auth/plugins';
import { newPassword, longestPassword, shortestPassword } from '#shared/accounts/password.ts';
import type { Db } from '../db/client.ts';
import * as schema from '../db/schema/auth.ts';
import type { LetterJob } from '../jobs/jobs.ts';
import { resetLetter, verifyLetter } from './letters.ts';

/** Header the server sets from the socket (or a trusted proxy): the address that rate limits go by. */
export const addressHeader = 'x-tubeplate-address';

interface AuthOptions {
  db: Db;
  publicUrl: string;
  secret: string;
  /** Multiplies every rate limit; 1 for people. */
  rateFactor: number;
  sendLetter: (letter: LetterJob) => Promise<void>;
}

const passwordPaths: Record<string, string> = {
  '/sign-up/email': 'password',
  '/reset-password': 'newPassword',
  '/change-password': 'newPassword',
};

/** The better-auth instance: e-mail and password, letters for verification and reset, TOTP as second factor. */
export function createAuth({ db, publicUrl, secret, rateFactor, sendLetter }: AuthOptions) {
  return betterAuth({
    appName: 'Tubeplate',
    baseURL: publicUrl,
    basePath: '/api/auth',
    secret,
    telemetry: { enabled: false },
    database: drizzleAdapter(db, { provider: 'pg', schema }),
    trustedOrigins: [publicUrl],
    user: {
      additionalFields: {
        units: { type: 'string', required: false, defaultValue: 'imperial', input: false },
      },
    },
    session: { expiresIn: 60 * 60 * 24 * 14, updateAge: 60 * 60 * 24 },
    emailAndPassword: {
      enabled: true,
      minPasswordLength: shortestPassword,
      maxPasswordLength: longestPassword,
      revokeSessionsOnPasswordReset: true,
      sendResetPassword: async ({ user, token }) => {
        await sendLetter(resetLetter(user, `${publicUrl}/reset?token=${encodeURIComponent(token)}`));
      },
    },
    emailVerification: {
      sendOnSignUp: true,
      autoSignInAfterVerification: true,
      sendVerificationEmail: async ({ user, token }) => {
        await sendLetter(verifyLetter(user, `${publicUrl}/verify?token=${encodeURIComponent(token)}`));
      },
    },
    plugins: [twoFactor({ issuer: 'Tubeplate' })],
    hooks: {
      before: createAuthMiddleware(async (request) => {
        const field = passwordPaths[request.path];
        if (!field) return;
        const body = request.body as Record<string, unknown> | undefined;
        const checked = newPassword.safeParse(body?.[field]);
        if (!checked.success) {
          throw new APIError('BAD_REQUEST', {
            code: 'PASSWORD_REFUSED',
            message: checked.error.issues[0]?.message,
          });
        }
      }),
    },
    rateLimit: {
      enabled: true,
      storage: 'database',
      window: 60,
      max: 120 * rateFactor,
      customRules: {
        '/sign-in/email': { window: 60, max: 10 * rateFactor },
        '/sign-up/email': { window: 300, max: 10 * rateFactor },
        '/request-password-reset': { window: 300, max: 5 * rateFactor },
        '/two-factor/verify-totp': { window: 60, max: 8 * rateFactor },
        '/two-factor/verify-backup-code': { window: 60, max: 8 * rateFactor },
      },
    },
    advanced: {
      useSecureCookies: publicUrl.startsWith('https:'),
      defaultCookieAttributes: { sameSite: 'lax', httpOnly: true },
      ipAddress: { ipAddressHeaders: [addressHeader] },
      cookiePrefix: 'tubeplate',
    },
  });
}

export type Auth = ReturnType<typeof createAuth>;
