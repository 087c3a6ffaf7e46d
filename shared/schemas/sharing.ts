import { z } from 'zod';
import { token } from './account.ts';
import { gliderFigures, gliderRole } from './glider.ts';
import { planSchema } from './plan.ts';
import { email } from './session.ts';

/** What an owner may make of somebody else; ownership itself is handed over, not given. */
export const memberRole = z.enum(['builder', 'pilot', 'reader']);

export const member = z.strictObject({
  userId: z.uuid(),
  name: z.string(),
  /** told to the owner only */
  email: z.string().nullable(),
  role: gliderRole,
  joinedAt: z.iso.datetime(),
  you: z.boolean(),
});
export const memberList = z.strictObject({ members: z.array(member) });
export const memberInput = z.strictObject({ role: memberRole });
export const ownershipInput = z.strictObject({ userId: z.uuid() });

export const invitationInput = z.strictObject({ email, role: memberRole });
/** An invitation that nobody has answered yet. */
export const invitation = z.strictObject({
  id: z.uuid(),
  gliderId: z.uuid(),
  email: z.string(),
  role: memberRole,
  invitedBy: z.string(),
  invitedAt: z.iso.datetime(),
  expiresAt: z.iso.datetime(),
});
export const invitationList = z.strictObject({ invitations: z.array(invitation) });
/** What whoever holds the link is told before answering. */
export const invitationPreview = z.strictObject({
  gliderName: z.string(),
  invitedBy: z.string(),
  /** the address that it was sent to */
  email: z.string(),
  role: memberRole,
  expiresAt: z.iso.datetime(),
});
export const invitationAccepted = z.strictObject({ gliderId: z.uuid(), role: gliderRole });

/** A link that shows a glider to whoever has it, without an account. */
export const readLink = z.strictObject({
  token,
  /** page of the client that it opens */
  path: z.string(),
  createdAt: z.iso.datetime(),
});
export const readLinkState = z.strictObject({ link: readLink.nullable() });
export const sharedGlider = z.strictObject({
  name: z.string(),
  plan: planSchema,
  figures: gliderFigures,
  updatedAt: z.iso.datetime(),
});

export type MemberRole = z.infer<typeof memberRole>;
export type MemberDto = z.infer<typeof member>;
export type MemberListDto = z.infer<typeof memberList>;
export type InvitationInput = z.infer<typeof invitationInput>;
export type InvitationDto = z.infer<typeof invitation>;
export type InvitationListDto = z.infer<typeof invitationList>;
export type InvitationPreviewDto = z.infer<typeof invitationPreview>;
export type InvitationAcceptedDto = z.infer<typeof invitationAccepted>;
export type ReadLinkDto = z.infer<typeof readLink>;
export type ReadLinkStateDto = z.infer<typeof readLinkState>;
export type SharedGliderDto = z.infer<typeof sharedGlider>;
