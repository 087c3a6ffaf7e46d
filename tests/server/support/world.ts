import type { Endpoint } from '#server/http/endpoint.ts';
import type { Club } from '#server/models/club.ts';
import { Session } from '#server/models/session.ts';
import { putPiecePhoto } from '#server/services/stock-photos.ts';
import type { TestApp } from './app.ts';
import { makePhoto, smallPicture } from './photos.ts';
import { makePerson, type Person } from './people.ts';
import type { Params } from './requests.ts';
import { addMember, makeGlider, makeInvitation, makeMaterial } from './rows.ts';
import { joinClub, makeClub, makeClubInvitation, makeEdition, showGlider } from './clubs.ts';
import { makePiece } from './stock.ts';
import { makeSheet } from './sheets.ts';

/** An owner with one of everything that an endpoint can be about. */
export interface World {
  owner: Person;
  glider: Awaited<ReturnType<typeof makeGlider>>;
  /** the owner keeps it, shows the glider to it, and has written an edition for it */
  club: Club;
  /** parameters of a path that lead to the owner's rows */
  paramsOf: (endpoint: Pick<Endpoint, 'path'>) => Params;
}

export async function makeWorld(app: TestApp): Promise<World> {
  const owner = await makePerson(app);
  const glider = await makeGlider({ owner: owner.user });
  const sheet = await makeSheet(glider, owner.user);
  const material = await makeMaterial({ owner: owner.user });
  const photo = await makePhoto(glider, owner.user);
  const piece = await makePiece(owner.user);
  await putPiecePhoto(owner.user, piece.id, await smallPicture());
  const member = await makePerson(app);
  await addMember(glider, member.user, 'reader');
  const invitation = await makeInvitation(glider, owner.user);
  const club = await makeClub(owner.user);
  await joinClub(club, member.user, 'member');
  await showGlider(club, glider);
  const clubInvitation = await makeClubInvitation(club, owner.user);
  const edition = await makeEdition(club);
  const session = await Session.findOne({ where: { userId: owner.user.id }, rejectOnEmpty: true });
  const ids: Record<string, string> = {
    gliders: glider.id,
    sheets: sheet.id,
    materials: material.id,
    photos: photo.id,
    rack: piece.id,
    invitations: invitation.id,
    account: session.id,
    clubs: club.id,
    'club-invitations': clubInvitation.id,
    'class-editions': edition.id,
  };
  return {
    owner,
    glider,
    club,
    paramsOf: ({ path }) => ({
      id: ids[path.split('/')[1] ?? ''] ?? '',
      version: '1',
      userId: member.user.id,
      gliderId: glider.id,
    }),
  };
}
