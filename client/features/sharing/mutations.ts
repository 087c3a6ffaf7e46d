import { useMutation, useQueryClient } from '@tanstack/react-query';
import { command, request } from '#client/lib/api.ts';
import { glider } from '#shared/schemas/glider.ts';
import {
  invitation,
  invitationAccepted,
  member,
  readLinkState,
  type InvitationInput,
  type MemberRole,
} from '#shared/schemas/sharing.ts';
import { sharingQueries } from './queries.ts';

const of = (gliderId: string) => `/gliders/${encodeURIComponent(gliderId)}`;

/** What the owner does; all of it is asked anew afterwards, for one thing moves another. */
function useSharing<T, R>(gliderId: string, mutationFn: (input: T) => Promise<R>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn,
    onSettled: () => client.invalidateQueries({ queryKey: sharingQueries.all(gliderId) }),
  });
}

export function useInvite(gliderId: string) {
  return useSharing(gliderId, (body: InvitationInput) =>
    request(`${of(gliderId)}/invitations`, invitation, { method: 'POST', body }),
  );
}

export function useRevoke(gliderId: string) {
  return useSharing(gliderId, (id: string) =>
    command(`/invitations/${encodeURIComponent(id)}`, { method: 'DELETE' }),
  );
}

export function useChangeRole(gliderId: string) {
  return useSharing(gliderId, ({ userId, role }: { userId: string; role: MemberRole }) =>
    request(`${of(gliderId)}/members/${encodeURIComponent(userId)}`, member, {
      method: 'PUT',
      body: { role },
    }),
  );
}

export function useRemoveMember(gliderId: string) {
  return useSharing(gliderId, (userId: string) =>
    command(`${of(gliderId)}/members/${encodeURIComponent(userId)}`, { method: 'DELETE' }),
  );
}

/** Switches the read-only link on (or answers the one there is), and off for good. */
export function useReadLink(gliderId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async (on: boolean) => {
      if (on) return request(`${of(gliderId)}/link`, readLinkState, { method: 'POST' });
      await command(`${of(gliderId)}/link`, { method: 'DELETE' });
      return { link: null };
    },
    onSuccess: (state) => client.setQueryData(sharingQueries.link(gliderId).queryKey, state),
  });
}

/** What changes whose glider it is, so that everything known of it is asked anew. */
function useOwnership<T, R>(mutationFn: (input: T) => Promise<R>) {
  const client = useQueryClient();
  return useMutation({
    mutationFn,
    onSuccess: async () => {
      await client.invalidateQueries({ queryKey: ['gliders'] });
      await client.invalidateQueries({ queryKey: ['sharing'] });
    },
  });
}

export function useHandOver(gliderId: string) {
  return useOwnership((userId: string) =>
    request(`${of(gliderId)}/ownership`, glider, { method: 'POST', body: { userId } }),
  );
}

export function useLeave(gliderId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => command(`${of(gliderId)}/membership`, { method: 'DELETE' }),
    onSuccess: () => client.invalidateQueries({ queryKey: ['gliders', 'list'] }),
  });
}

export function useAccept() {
  return useOwnership((token: string) =>
    request('/invitations/accept', invitationAccepted, { method: 'POST', body: { token } }),
  );
}

export function useDecline() {
  return useMutation({
    mutationFn: (token: string) => command('/invitations/decline', { method: 'POST', body: { token } }),
  });
}
