import { z } from 'zod';
import { assignmentInput, gliderAssignment } from '#shared/schemas/assignment.ts';
import { estimate, estimateInput } from '#shared/schemas/estimate.ts';
import { gliderSave, gliderSaveList, gliderState, saveNameInput } from '#shared/schemas/glider-save.ts';
import {
  archiveInput,
  copiesInput,
  glider,
  gliderCopies,
  gliderInput,
  gliderList,
  gliderSummary,
} from '#shared/schemas/glider.ts';
import { material, materialInput, materialList, materialUses } from '#shared/schemas/material.ts';
import { photo, photoForm, photoInput, photoList } from '#shared/schemas/photo.ts';
import { planSchema } from '#shared/schemas/plan.ts';
import { problem } from '#shared/schemas/problem.ts';
import {
  importInput,
  importPreview,
  importResult,
  rackList,
  reservationInput,
  splitInput,
  splitResult,
  useInput,
  useResult,
} from '#shared/schemas/rack.ts';
import { session, signIn, user } from '#shared/schemas/session.ts';
import {
  account,
  accountChanges,
  accountDeletion,
  accountDeletionInput,
  accountSessionList,
  emailChange,
  passwordChange,
  passwordForgotten,
  passwordReset,
  tokenInput,
  verifiedEmail,
} from '#shared/schemas/account.ts';
import { mailList } from '#shared/schemas/mail.ts';
import {
  invitation,
  invitationAccepted,
  invitationInput,
  invitationList,
  invitationPreview,
  member,
  memberInput,
  memberList,
  ownershipInput,
  readLinkState,
  sharedGlider,
} from '#shared/schemas/sharing.ts';
import { sheet, sheetInput, sheetList } from '#shared/schemas/sheet.ts';
import { stockPiece, stockPieceInput } from '#shared/schemas/stock-piece.ts';
import { gliderTrials, trialsInput } from '#shared/schemas/trials.ts';
import {
  buildTerms,
  buildTermsInput,
  weighing,
  weighingInput,
  weighingList,
} from '#shared/schemas/weighing.ts';
import { firstFlight, firstFlightInput, firstFlightList } from '#shared/schemas/first-flight.ts';
import * as classEditions from '#shared/schemas/class-edition.ts';
import * as clubs from '#shared/schemas/club.ts';
import { health } from '#server/routes/health.ts';
import { newUser } from '#server/routes/users.ts';

/** The objects that a module of schemas gives away, by the module's own names. */
function objectsOf(module: Record<string, unknown>): Record<string, z.ZodType> {
  const objects = Object.entries(module).flatMap(([name, schema]) =>
    schema instanceof z.ZodObject ? [[name.charAt(0).toUpperCase() + name.slice(1), schema] as const] : [],
  );
  return Object.fromEntries(objects);
}

/** The name in the description of every schema that a body or an answer has. */
const NAMES: Record<string, z.ZodType> = {
  Plan: planSchema,
  EstimateInput: estimateInput,
  Estimate: estimate,
  GliderInput: gliderInput,
  Glider: glider,
  GliderSummary: gliderSummary,
  GliderList: gliderList,
  GliderCopies: gliderCopies,
  CopiesInput: copiesInput,
  ArchiveInput: archiveInput,
  GliderSave: gliderSave,
  GliderSaveList: gliderSaveList,
  GliderState: gliderState,
  SaveNameInput: saveNameInput,
  SheetInput: sheetInput,
  Sheet: sheet,
  SheetList: sheetList,
  Photo: photo,
  PhotoForm: photoForm,
  PhotoInput: photoInput,
  PhotoList: photoList,
  StockPieceInput: stockPieceInput,
  StockPiece: stockPiece,
  RackList: rackList,
  ImportPreview: importPreview,
  ImportInput: importInput,
  ImportResult: importResult,
  SplitInput: splitInput,
  SplitResult: splitResult,
  ReservationInput: reservationInput,
  UseInput: useInput,
  UseResult: useResult,
  AssignmentInput: assignmentInput,
  GliderAssignment: gliderAssignment,
  TrialsInput: trialsInput,
  GliderTrials: gliderTrials,
  WeighingInput: weighingInput,
  Weighing: weighing,
  WeighingList: weighingList,
  BuildTermsInput: buildTermsInput,
  BuildTerms: buildTerms,
  FirstFlightInput: firstFlightInput,
  FirstFlight: firstFlight,
  FirstFlightList: firstFlightList,
  MaterialInput: materialInput,
  Material: material,
  MaterialList: materialList,
  MaterialUses: materialUses,
  Account: account,
  AccountChanges: accountChanges,
  AccountDeletion: accountDeletion,
  AccountDeletionInput: accountDeletionInput,
  AccountSessionList: accountSessionList,
  EmailChange: emailChange,
  PasswordChange: passwordChange,
  PasswordForgotten: passwordForgotten,
  PasswordReset: passwordReset,
  TokenInput: tokenInput,
  VerifiedEmail: verifiedEmail,
  MailList: mailList,
  Invitation: invitation,
  InvitationAccepted: invitationAccepted,
  InvitationInput: invitationInput,
  InvitationList: invitationList,
  InvitationPreview: invitationPreview,
  Member: member,
  MemberInput: memberInput,
  MemberList: memberList,
  OwnershipInput: ownershipInput,
  ReadLinkState: readLinkState,
  SharedGlider: sharedGlider,
  ...objectsOf(clubs),
  ...objectsOf(classEditions),
  NewUser: newUser,
  SignIn: signIn,
  User: user,
  Session: session,
  Health: health,
  Problem: problem,
};

export type JsonSchema = z.core.JSONSchema.BaseSchema;

const placeOf = (name: string) => `#/components/schemas/${name}`;

/** Points to a schema; one without a name is a mistake in the list above. */
export function reference(schema: z.ZodType): JsonSchema {
  const name = Object.keys(NAMES).find((candidate) => NAMES[candidate] === schema);
  if (name === undefined) throw new Error('A schema of an endpoint has no name in openapi/components.ts.');
  return { $ref: placeOf(name) };
}

/** JSON Schema of everything named, each pointing to the others. */
export function componentSchemas(): Record<string, JsonSchema> {
  const registry = z.registry<{ id: string }>();
  for (const [id, schema] of Object.entries(NAMES)) registry.add(schema, { id });
  const { schemas } = z.toJSONSchema(registry, { uri: placeOf, io: 'input' });
  return Object.fromEntries(Object.entries(schemas).map(([name, schema]) => [name, inlineSchema(schema)]));
}

/** Without the marks of a document of its own. */
export function inlineSchema({ $schema: _dialect, $id: _id, ...schema }: JsonSchema): JsonSchema {
  return schema;
}
