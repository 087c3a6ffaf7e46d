import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import { command, request } from '#client/lib/api.ts';
import {
  account,
  accountDeletion,
  accountSessionList,
  type AccountChanges,
  type EmailChange,
  type PasswordChange,
} from '#shared/schemas/account.ts';

const ACCOUNT = ['account'] as const;

export const accountQuery = queryOptions({
  queryKey: [...ACCOUNT, 'own'],
  queryFn: ({ signal }) => request('/account', account, { signal }),
});

export const accountSessionsQuery = queryOptions({
  queryKey: [...ACCOUNT, 'sessions'],
  queryFn: ({ signal }) => request('/account/sessions', accountSessionList, { signal }),
});

/** Everything of the account may be asked for as one file; the browser keeps it as it comes. */
export const EXPORT_HREF = '/api/account/export';

/** A change of the account; what the server says of it afterwards is shown. */
function useAccountChange<T, R>(mutationFn: (input: T) => Promise<R>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn,
    onSuccess: () => client.invalidateQueries({ queryKey: ACCOUNT }),
  });
}

export function useChangeAccount() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: AccountChanges) => request('/account', account, { method: 'PATCH', body }),
    onSuccess: async (changed) => {
      client.setQueryData(accountQuery.queryKey, changed);
      // The name stands over every page.
      await client.invalidateQueries({ queryKey: ['session'] });
    },
  });
}

export function useChangeEmail() {
  return useAccountChange((body: EmailChange) =>
    request('/account/email', account, { method: 'POST', body }),
  );
}

/** Sends the link to confirm an address again. */
export function useVerifyAgain() {
  return useMutation({ mutationFn: () => command('/account/verification', { method: 'POST' }) });
}

export function useChangePassword() {
  return useAccountChange((body: PasswordChange) => command('/account/password', { method: 'PUT', body }));
}

export function useEndSession() {
  return useAccountChange((id: string) =>
    command(`/account/sessions/${encodeURIComponent(id)}`, { method: 'DELETE' }),
  );
}

export function useEndOtherSessions() {
  return useAccountChange(() => command('/account/sessions', { method: 'DELETE' }));
}

export function deleteAccount(password: string) {
  return request('/account/deletion', accountDeletion, { method: 'POST', body: { password } });
}
