import { queryOptions } from '@tanstack/react-query';
import { request } from '#client/lib/api.ts';
import {
  invitationList,
  invitationPreview,
  memberList,
  readLinkState,
  sharedGlider,
} from '#shared/schemas/sharing.ts';

const of = (gliderId: string) => `/gliders/${encodeURIComponent(gliderId)}`;

/** Everything fetched about who may see a glider. */
export const sharingQueries = {
  all: (gliderId: string) => ['sharing', gliderId] as const,
  members: (gliderId: string) =>
    queryOptions({
      queryKey: ['sharing', gliderId, 'members'],
      queryFn: ({ signal }) => request(`${of(gliderId)}/members`, memberList, { signal }),
    }),
  invitations: (gliderId: string) =>
    queryOptions({
      queryKey: ['sharing', gliderId, 'invitations'],
      queryFn: ({ signal }) => request(`${of(gliderId)}/invitations`, invitationList, { signal }),
    }),
  link: (gliderId: string) =>
    queryOptions({
      queryKey: ['sharing', gliderId, 'link'],
      queryFn: ({ signal }) => request(`${of(gliderId)}/link`, readLinkState, { signal }),
    }),
  /** What an invitation says to whoever holds its link; asked by POST, so that the token is in no log. */
  preview: (token: string) =>
    queryOptions({
      queryKey: ['invitations', token],
      queryFn: ({ signal }) =>
        request('/invitations/preview', invitationPreview, { method: 'POST', body: { token }, signal }),
    }),
  shared: (token: string) =>
    queryOptions({
      queryKey: ['shared', token],
      queryFn: ({ signal }) => request(`/shared/${encodeURIComponent(token)}`, sharedGlider, { signal }),
      gcTime: 0,
    }),
};
