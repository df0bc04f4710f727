import { queryOptions, useMutation } from '@tanstack/react-query';
import * as contract from '#shared/accounts/contract.ts';
import { call } from '#web/lib/api.ts';
import { authCall } from './auth-client.ts';

export const accountQueries = {
  all: ['accounts'] as const,
  me: () =>
    queryOptions({
      queryKey: [...accountQueries.all, 'me'] as const,
      queryFn: ({ signal }) => call(contract.getMe, {}, { signal }),
      staleTime: 60_000,
    }),
  site: () =>
    queryOptions({
      queryKey: [...accountQueries.all, 'site'] as const,
      queryFn: ({ signal }) => call(contract.getSite, {}, { signal }),
      staleTime: Infinity,
    }),
  letters: () =>
    queryOptions({
      queryKey: [...accountQueries.all, 'letters'] as const,
      queryFn: ({ signal }) => call(contract.listLetters, {}, { signal }),
    }),
  sessions: () =>
    queryOptions({
      queryKey: [...accountQueries.all, 'sessions'] as const,
      queryFn: () => authCall<Session[]>('GET', '/list-sessions'),
    }),
};

export interface Session {
  token: string;
  createdAt: string;
  userAgent: string | null;
}

/** Signs in; says whether a second factor is still asked for. Whatever was remembered of another person is forgotten. */
export function useSignIn() {
  return useMutation({
    mutationFn: (body: { email: string; password: string }) =>
      authCall<{ twoFactorRedirect?: boolean }>('POST', '/sign-in/email', body),
    onSuccess: async ({ twoFactorRedirect }, _body, _context, { client }) => {
      if (!twoFactorRedirect) await client.resetQueries();
    },
  });
}

export function useVerifyTotp() {
  return useMutation({
    mutationFn: (body: { code: string }) => authCall<object>('POST', '/two-factor/verify-totp', body),
    onSuccess: (_answer, _body, _context, { client }) => client.resetQueries(),
  });
}

export function useSignUp() {
  return useMutation({
    mutationFn: (body: { name: string; email: string; password: string }) =>
      authCall<object>('POST', '/sign-up/email', body),
    onSuccess: (_answer, _body, _context, { client }) => client.resetQueries(),
  });
}

export function useSignOut() {
  return useMutation({
    mutationFn: ({ isEverywhere }: { isEverywhere: boolean }) =>
      isEverywhere
        ? authCall<object>('POST', '/revoke-sessions', {}).then(() =>
            authCall<object>('POST', '/sign-out', {}).catch(() => ({})),
          )
        : authCall<object>('POST', '/sign-out', {}),
    onSettled: (_answer, _error, _body, _context, { client }) => client.resetQueries(),
  });
}

export function useUpdateMe() {
  return useMutation({
    mutationFn: (body: { name?: string; units?: contract.Units }) => call(contract.updateMe, { body }),
    onSuccess: (me, _body, _context, { client }) => client.setQueryData(accountQueries.me().queryKey, { me }),
  });
}

export function useSkipEnrolment() {
  return useMutation({
    mutationFn: () => call(contract.skipEnrolment, {}),
    onSuccess: (_answer, _body, _context, { client }) => client.resetQueries(),
  });
}

export function useStartTotp() {
  return useMutation({
    mutationFn: (body: { password: string }) =>
      authCall<{ totpURI: string; backupCodes: string[] }>('POST', '/two-factor/enable', body),
  });
}

/** Confirms an address by the token of its letter; asked once. */
export const verificationQuery = (token: string) =>
  queryOptions({
    queryKey: [...accountQueries.all, 'verification', token] as const,
    queryFn: () => authCall<object>('GET', `/verify-email?token=${encodeURIComponent(token)}`),
    retry: false,
    staleTime: Infinity,
  });

export function useResendVerification() {
  return useMutation({
    mutationFn: (body: { email: string }) => authCall<object>('POST', '/send-verification-email', body),
  });
}
