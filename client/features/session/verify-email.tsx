import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { request } from '#client/lib/api.ts';
import { verifiedEmail } from '#shared/schemas/account.ts';

interface VerifyEmailProps {
  token: string;
  /** where to go from here */
  links: ReactNode;
}

/** Confirms an address by the mailed link; a press, so that a mail program that opens links does not use it up. */
export function VerifyEmail({ token, links }: VerifyEmailProps) {
  const client = useQueryClient();
  const confirm = useMutation({
    mutationFn: () => request('/email-verifications', verifiedEmail, { method: 'POST', body: { token } }),
    onSuccess: () =>
      Promise.all(['session', 'account'].map((key) => client.invalidateQueries({ queryKey: [key] }))),
  });
  if (confirm.data) {
    return (
      <>
        <h1 className="text-figure font-semibold">The address is confirmed</h1>
        <p className="mt-2" role="status">
          {confirm.data.email} is yours. Mail about your gliders goes there, and others can be invited.
        </p>
        {links}
      </>
    );
  }
  return (
    <>
      <h1 className="text-figure font-semibold">Is this address yours?</h1>
      <p className="mt-2">
        You got here by a link that was mailed to it. Confirm, and it belongs to your account.
      </p>
      {confirm.error && (
        <Notice tone="red" live className="mt-4">
          {confirm.error.message}
        </Notice>
      )}
      <p className="mt-6 flex flex-wrap items-center gap-4">
        <Button variant="primary" onClick={() => confirm.mutate()} pending={confirm.isPending}>
          Confirm the address
        </Button>
      </p>
      {confirm.error && links}
    </>
  );
}
