import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import { assignmentInput } from '#shared/schemas/assignment.ts';
import { stockPiece } from '#shared/schemas/stock-piece.ts';
import { exportAccount } from '#server/services/account-export.ts';
import { putPiecePhoto } from '#server/services/stock-photos.ts';
import { presentUser } from '#server/presenters/user.ts';
import { useApp } from '../support/app.ts';
import { makePerson } from '../support/people.ts';
import { smallPicture } from '../support/photos.ts';
import { makeGlider } from '../support/rows.ts';
import { assignmentOf, makePiece } from '../support/stock.ts';

const app = useApp();

const account = z.looseObject({
  rack: z.array(z.strictObject({ ...stockPiece.shape, photoJpegBase64: z.string().optional() })),
  gliders: z.array(z.looseObject({ id: z.uuid(), assignment: assignmentInput.nullable() })),
});

describe('what a user takes along', () => {
  it('holds the whole rack with its photos, and which part of a glider is cut from which piece', async () => {
    const person = await makePerson(app);
    await makePiece((await makePerson(app)).user);
    const [glider, bare] = [
      await makeGlider({ owner: person.user }),
      await makeGlider({ owner: person.user }),
    ];
    const [shown, spent] = [await makePiece(person.user), await makePiece(person.user)];
    await putPiecePhoto(person.user, shown.id, await smallPicture());
    await person.agent.post(`/api/rack/${spent.id}/use`).send({ gliderId: null, leftovers: [] }).expect(200);
    const kept = assignmentOf(shown.id, null);
    await person.agent
      .put(`/api/gliders/${glider.id}/assignment`)
      .set('If-Match', '"1"')
      .send(kept)
      .expect(200);

    let text = '';
    for await (const part of exportAccount(presentUser(person.user))) text += part;

    const { rack, gliders } = account.parse(JSON.parse(text));
    expect(rack.map(({ number, state }) => [number, state])).toEqual([
      [1, 'reserved'],
      [2, 'used'],
    ]);
    const photo = Buffer.from(rack[0]?.photoJpegBase64 ?? '', 'base64');
    expect([...photo.subarray(0, 3)]).toEqual([0xff, 0xd8, 0xff]);
    expect(rack[1]).not.toHaveProperty('photoJpegBase64');
    const assignments = new Map(gliders.map(({ id, assignment }) => [id, assignment]));
    expect(assignments.get(glider.id)).toEqual(kept);
    expect(assignments.get(bare.id)).toBeNull();
  });
});
