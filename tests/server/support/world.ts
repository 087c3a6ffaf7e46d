import type { Endpoint } from '#server/http/endpoint.ts';
import { putPiecePhoto } from '#server/services/stock-photos.ts';
import type { TestApp } from './app.ts';
import { makePhoto, smallPicture } from './photos.ts';
import { makePerson, type Person } from './people.ts';
import type { Params } from './requests.ts';
import { makeGlider, makeMaterial } from './rows.ts';
import { makePiece } from './stock.ts';
import { makeSheet } from './sheets.ts';

/** An owner with one of everything that an endpoint can be about. */
export interface World {
  owner: Person;
  glider: Awaited<ReturnType<typeof makeGlider>>;
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
  const ids: Record<string, string> = {
    gliders: glider.id,
    sheets: sheet.id,
    materials: material.id,
    photos: photo.id,
    rack: piece.id,
  };
  return {
    owner,
    glider,
    paramsOf: ({ path }) => ({ id: ids[path.split('/')[1] ?? ''] ?? '', version: '1' }),
  };
}
