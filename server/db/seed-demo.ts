import { randomUUID } from 'node:crypto';
import type { Transaction } from 'sequelize';
import { hashPassword } from '#server/auth/password.ts';
import { estimatePlan } from '#server/estimating/estimate-plan.ts';
import { GliderMember } from '#server/models/glider-member.ts';
import { Glider } from '#server/models/glider.ts';
import { User } from '#server/models/user.ts';
import { headlineOf } from '#server/services/figures.ts';
import { insertGlider } from '#server/services/gliders.ts';
import { insertSheet } from '#server/services/sheets.ts';
import { database, inTransaction } from '#server/services/transaction.ts';
import { readDemoPlan, readPeople, SeedError, type People } from './seed-files.ts';
import { seedDemoBuilt } from './seed-built.ts';
import { seedDemoClub } from './seed-club.ts';
import { seedDemoFlight } from './seed-flight.ts';
import { seedDemoRack } from './seed-rack.ts';
import { SEED_LOCK } from './seed-materials.ts';

/**
 * Adds the demo's people, gliders, wood and club where nobody has an account yet, whole or not at all.
 * @returns whether it was added
 */
export async function seedDemo(): Promise<boolean> {
  if ((await User.count()) > 0) return false;
  const file = await readPeople();
  const { people, gliders } = file;
  const hashes = await Promise.all(people.map(({ password }) => hashPassword(password)));
  return inTransaction(async (transaction) => {
    await database().query(`SELECT pg_advisory_xact_lock(${SEED_LOCK})`, { transaction });
    if ((await User.count({ transaction })) > 0) return false;
    const users = new Map<string, User>();
    for (const [i, { key, name, email, role }] of people.entries()) {
      const user = await User.create(
        { name, email, role, passwordHash: hashes[i] ?? '', verifiedAt: new Date() },
        { transaction },
      );
      users.set(key, user);
    }
    const gliderIds = new Map<string, string>();
    for (const glider of gliders) {
      gliderIds.set(glider.file, await addGlider(glider, users, transaction));
    }
    await seedDemoRack(users, gliderIds, transaction);
    await seedDemoBuilt(users, gliderIds, transaction);
    await seedDemoFlight(users, gliderIds, transaction);
    await seedDemoClub({ people: file, users, gliderIds }, transaction);
    return true;
  });
}

async function addGlider(
  { file, owner, members, sheets }: People['gliders'][number],
  users: ReadonlyMap<string, User>,
  transaction: Transaction,
): Promise<string> {
  const person = (key: string) => {
    const user = users.get(key);
    if (!user) throw new SeedError(`data/demo/people.json has no person “${key}”.`);
    return user;
  };
  const { id: ownerId, name } = person(owner);
  const id = randomUUID();
  const plan = await readDemoPlan(file);
  const result = await estimatePlan(plan);
  await insertGlider({ id, ownerId, plan, headline: headlineOf(plan, result), transaction });
  await GliderMember.bulkCreate(
    members.map((member) => ({ ownerId, gliderId: id, userId: person(member.person).id, role: member.role })),
    { transaction },
  );
  const glider = await Glider.findByPk(id, { transaction, rejectOnEmpty: true });
  for (const { note } of sheets) {
    await insertSheet({
      id: randomUUID(),
      glider,
      result,
      note,
      savedBy: { id: ownerId, name },
      transaction,
    });
  }
  return id;
}
