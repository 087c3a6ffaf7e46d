import type { ClubRole } from '#shared/schemas/club.ts';
import type { MemberRole } from '#shared/schemas/sharing.ts';
import { surroundings } from '#server/surroundings.ts';
import type { Letter } from './letter.ts';

const href = (path: string) => `${surroundings().address()}${path}`;
const NOT_YOU = 'If that was not you, do nothing: without the link nothing changes.';

export const verifyLetter = (name: string, token: string): Letter => ({
  subject: 'Confirm your address',
  lines: [`Hello ${name},`, 'press below to confirm that this address is yours.'],
  action: { label: 'Confirm the address', href: href(`/verify-email/${token}`) },
  notes: ['The link is good for one day and for one use.', NOT_YOU],
});

export const addressChangeLetter = (name: string, next: string): Letter => ({
  subject: 'Your address is about to change',
  lines: [
    `Hello ${name},`,
    `somebody who knows your password asked that ${next} take the place of this address. It does so once the link that was mailed there is followed.`,
  ],
  notes: ['If that was not you, sign in and set another password now; it signs everybody else out.'],
  action: { label: 'To the account', href: href('/account') },
});

export const resetLetter = (name: string, token: string): Letter => ({
  subject: 'Set a new password',
  lines: [`Hello ${name},`, 'press below to set a new password in place of the forgotten one.'],
  action: { label: 'Set a new password', href: href(`/reset-password/${token}`) },
  notes: ['The link is good for one hour and for one use.', NOT_YOU],
});

export const passwordChangedLetter = (name: string): Letter => ({
  subject: 'Your password was changed',
  lines: [
    `Hello ${name},`,
    'the password of your account was changed, and every other browser was signed out.',
  ],
  notes: ['If that was not you, set a new one by “Forgotten password” on the sign-in page.'],
  action: { label: 'To the sign-in page', href: href('/sign-in') },
});

const INVITATION_NOTES = [
  'The link is good for 14 days and for one use.',
  'If you do not know who that is, leave it: nothing happens.',
];

/** What each role may do, in the words of the invitation. */
const MAY: Record<MemberRole, string> = {
  builder: 'You may change its drawing, weigh its parts and save its sheets.',
  pilot: 'You may weigh it, trim it, save its sheets and sign its first flight.',
  reader: 'You may look at everything in it.',
};

interface Invited {
  gliderName: string;
  invitedBy: string;
  role: MemberRole;
  token: string;
}

export const invitationLetter = ({ gliderName, invitedBy, role, token }: Invited): Letter => ({
  subject: `${invitedBy} invites you to the glider ${gliderName}`,
  lines: [`${invitedBy} wants you as a ${role} of the glider ${gliderName}.`, MAY[role]],
  action: { label: 'Look at the invitation', href: href(`/invitations/${token}`) },
  notes: INVITATION_NOTES,
});

/** What each role may do in a club, in the words of the invitation. */
const MAY_IN_CLUB: Record<ClubRole, string> = {
  secretary: 'You may keep its members, its gliders and its limits of classes.',
  director: 'You may run its contests and weigh in.',
  member: 'You may show gliders to it and enter its contests.',
};

interface InvitedToClub {
  clubName: string;
  invitedBy: string;
  role: ClubRole;
  token: string;
}

export const clubInvitationLetter = ({ clubName, invitedBy, role, token }: InvitedToClub): Letter => ({
  subject: `${invitedBy} invites you to ${clubName}`,
  lines: [`${invitedBy} wants you as a ${role} of ${clubName}.`, MAY_IN_CLUB[role]],
  action: { label: 'Look at the invitation', href: href(`/club-invitations/${token}`) },
  notes: INVITATION_NOTES,
});
