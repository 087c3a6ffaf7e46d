import { z } from 'zod';
import { LIMITS } from './limits.ts';
import { title } from './plan-parts.ts';
import { email } from './session.ts';

/** What a person is in a club: the secretary keeps it, a director runs its contests. */
export const clubRole = z.enum(['secretary', 'director', 'member']);

/** What the asking user may do, so that the client does not guess. */
export const clubAbilities = z.strictObject({
  /** name and place */
  edit: z.boolean(),
  /** invite, change roles, remove members */
  keepMembers: z.boolean(),
  /** add own editions of classes, change unused ones */
  keepClasses: z.boolean(),
  /** make contests, take entries, weigh */
  runContests: z.boolean(),
  shareGlider: z.boolean(),
});

const place = z.string().trim().max(LIMITS.name.max, `Must have at most ${LIMITS.name.max} characters.`);

export const clubInput = z.strictObject({ name: title(), place });
export const club = z.strictObject({
  id: z.uuid(),
  name: z.string(),
  place: z.string(),
  role: clubRole,
  can: clubAbilities,
  members: z.int(),
  /** counts changes of name and place; also the ETag */
  version: z.int(),
});
export const clubList = z.strictObject({ clubs: z.array(club) });

export const clubMember = z.strictObject({
  userId: z.uuid(),
  name: z.string(),
  /** told to the secretary, and of oneself */
  email: z.string().nullable(),
  role: clubRole,
  joinedAt: z.iso.datetime(),
  you: z.boolean(),
});
export const clubMemberList = z.strictObject({ members: z.array(clubMember) });
export const clubMemberInput = z.strictObject({ role: clubRole });

export const clubInvitationInput = z.strictObject({ email, role: clubRole });
/** An invitation that nobody has answered yet. */
export const clubInvitation = z.strictObject({
  id: z.uuid(),
  clubId: z.uuid(),
  email: z.string(),
  role: clubRole,
  invitedBy: z.string(),
  invitedAt: z.iso.datetime(),
  expiresAt: z.iso.datetime(),
});
export const clubInvitationList = z.strictObject({ invitations: z.array(clubInvitation) });
/** What whoever holds the link is told before answering. */
export const clubInvitationPreview = z.strictObject({
  clubName: z.string(),
  invitedBy: z.string(),
  /** the address that it was sent to */
  email: z.string(),
  role: clubRole,
  expiresAt: z.iso.datetime(),
});
export const clubInvitationAccepted = z.strictObject({ clubId: z.uuid(), role: clubRole });

/** A glider that its owner lets the whole club see. */
export const clubGlider = z.strictObject({
  gliderId: z.uuid(),
  name: z.string(),
  ownerName: z.string(),
  yours: z.boolean(),
  sharedAt: z.iso.datetime(),
});
export const clubGliderList = z.strictObject({ gliders: z.array(clubGlider) });

export type ClubRole = z.infer<typeof clubRole>;
export type ClubAbilities = z.infer<typeof clubAbilities>;
export type ClubInput = z.infer<typeof clubInput>;
export type ClubDto = z.infer<typeof club>;
export type ClubListDto = z.infer<typeof clubList>;
export type ClubMemberDto = z.infer<typeof clubMember>;
export type ClubMemberListDto = z.infer<typeof clubMemberList>;
export type ClubInvitationInput = z.infer<typeof clubInvitationInput>;
export type ClubInvitationDto = z.infer<typeof clubInvitation>;
export type ClubInvitationListDto = z.infer<typeof clubInvitationList>;
export type ClubInvitationPreviewDto = z.infer<typeof clubInvitationPreview>;
export type ClubInvitationAcceptedDto = z.infer<typeof clubInvitationAccepted>;
export type ClubGliderDto = z.infer<typeof clubGlider>;
export type ClubGliderListDto = z.infer<typeof clubGliderList>;
