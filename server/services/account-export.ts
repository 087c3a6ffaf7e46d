import type { UserDto } from '#shared/schemas/session.ts';
import { FirstFlight } from '#server/models/first-flight.ts';
import { GliderMember } from '#server/models/glider-member.ts';
import { GliderPhoto } from '#server/models/glider-photo.ts';
import { GliderSave } from '#server/models/glider-save.ts';
import { Glider } from '#server/models/glider.ts';
import { GliderTrials } from '#server/models/glider-trials.ts';
import { Material } from '#server/models/material.ts';
import { Sheet } from '#server/models/sheet.ts';
import { Weighing } from '#server/models/weighing.ts';
import { presentFirstFlight } from '#server/presenters/first-flight.ts';
import { presentSheet } from '#server/presenters/sheet.ts';
import { presentWeighing } from '#server/presenters/weighing.ts';
import { getAccount } from './account.ts';
import { exportAssignment, exportRack } from './rack-export.ts';
import { readPicture } from './stored-files.ts';

const AT_ONCE = 20;

/** One JSON document in pieces, so that no more than a few rows are held at a time. */
export async function* exportAccount(actor: UserDto): AsyncGenerator<string> {
  yield `{"format":"featherbeam account","version":1,"account":${JSON.stringify(await getAccount(actor))}`;
  yield ',"materials":';
  yield JSON.stringify((await Material.findAll({ where: { ownerId: actor.id } })).map((row) => row.toJSON()));
  yield ',"rack":';
  yield* exportRack(actor.id);
  const members = await GliderMember.findAll({
    where: { userId: actor.id },
    attributes: ['gliderId', 'role'],
  });
  yield ',"gliders":[';
  let first = true;
  for (const { gliderId, role } of members) {
    const glider = await Glider.findByPk(gliderId);
    if (!glider) continue;
    yield first ? '' : ',';
    first = false;
    if (role === 'owner') yield* exportGlider(glider);
    else yield JSON.stringify({ id: glider.id, name: glider.name, role });
  }
  yield ']}\n';
}

/** A glider of one's own with everything in it; of others' only that one is a member, for the rest is theirs. */
async function* exportGlider({ id, name, version, plan, updatedAt }: Glider): AsyncGenerator<string> {
  const head = { id, name, role: 'owner', version, updatedAt, plan };
  const trials = await GliderTrials.findByPk(id);
  const weighings = await Weighing.findAll({ where: { gliderId: id }, order: [['number', 'ASC']] });
  const flights = await FirstFlight.findAll({ where: { gliderId: id }, order: [['number', 'ASC']] });
  yield JSON.stringify({
    ...head,
    trials: trials && { trials: trials.trials, terms: trials.terms },
    assignment: await exportAssignment(id),
    weighings: weighings.map((row) => presentWeighing(row, null)),
    firstFlights: flights.map(presentFirstFlight),
  }).slice(0, -1);
  yield ',"saves":';
  yield* inBatches((offset) =>
    GliderSave.findAll({ where: { gliderId: id }, order: [['version', 'ASC']], limit: AT_ONCE, offset }),
  );
  yield ',"sheets":';
  yield* inBatches(async (offset) =>
    (
      await Sheet.findAll({ where: { gliderId: id }, order: [['number', 'ASC']], limit: AT_ONCE, offset })
    ).map(presentSheet),
  );
  yield ',"photos":[';
  const photos = await GliderPhoto.findAll({ where: { gliderId: id }, order: [['addedAt', 'ASC']] });
  for (const [i, { file, caption, addedAt }] of photos.entries()) {
    const jpeg = await readPicture(file, 'image');
    yield `${i === 0 ? '' : ','}${JSON.stringify({ caption, addedAt, jpegBase64: jpeg?.toString('base64') ?? null })}`;
  }
  yield ']}';
}

async function* inBatches(read: (offset: number) => Promise<readonly object[]>): AsyncGenerator<string> {
  yield '[';
  for (let offset = 0; ; offset += AT_ONCE) {
    const rows = await read(offset);
    if (rows.length > 0)
      yield `${offset === 0 ? '' : ','}${rows.map((row) => JSON.stringify(row)).join(',')}`;
    if (rows.length < AT_ONCE) break;
  }
  yield ']';
}
