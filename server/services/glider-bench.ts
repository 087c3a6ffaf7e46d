import { createHash } from 'node:crypto';
import type { GliderCopiesDto, GliderSummaryDto } from '#shared/schemas/glider.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { UserDto } from '#shared/schemas/session.ts';
import { notFound } from '#server/errors.ts';
import { GliderMember } from '#server/models/glider-member.ts';
import { Glider } from '#server/models/glider.ts';
import { authorizeGlider } from '#server/policies/glider.ts';
import { authorizeSite } from '#server/policies/site.ts';
import { presentGliderSummary } from '#server/presenters/glider.ts';
import { lockGlider } from './glider-access.ts';
import { insertGlider } from './gliders.ts';
import { makeOnce } from './idempotency.ts';
import { inTransaction } from './transaction.ts';

/** Puts a glider out of the way, or takes it back; its plan and its last change stay as they are. */
export function archiveGlider(actor: UserDto, id: string, archived: boolean): Promise<GliderSummaryDto> {
  return inTransaction(async (transaction) => {
    const { glider, role } = await lockGlider(actor, id, 'archive', transaction);
    if (archived !== (glider.archivedAt !== null)) {
      await glider.update({ archivedAt: archived ? new Date() : null }, { transaction });
    }
    return presentGliderSummary(glider, role, actor.name);
  });
}

/**
 * Copies gliders that the asker may read, all of them or none, as gliders of his own; the same key of the same user
 * copies them once.
 * @throws AppError `not_found` where one of them is not to be seen
 */
export async function copyGliders(
  actor: UserDto,
  ids: string[],
  key: string | undefined,
): Promise<GliderCopiesDto> {
  authorizeSite(actor, 'addGlider');
  const originals = await readable(actor, ids);
  const asked = createHash('sha256').update(ids.join(' ')).digest('hex');
  const batch = await inTransaction((transaction) =>
    makeOnce({ userId: actor.id, key, purpose: `copies of ${asked}`, transaction }, async (batchId) => {
      for (const [i, glider] of originals.entries()) {
        const plan = { ...glider.plan, name: copyName(glider.name) };
        const { mass, percentMac, wingLoading, balance, outline } = glider;
        const headline = { mass, percentMac, wingLoading, balance, outline };
        const id = idInBatch(batchId, i);
        await insertGlider({ id, ownerId: actor.id, plan, headline, transaction });
      }
    }),
  );
  const made = await Glider.findAll({
    attributes: { exclude: ['plan'] },
    where: { id: ids.map((_, i) => idInBatch(batch, i)), ownerId: actor.id },
  });
  const byId = new Map(made.map((glider) => [glider.id, glider]));
  return {
    gliders: ids.flatMap((_, i) => {
      const glider = byId.get(idInBatch(batch, i));
      return glider ? [presentGliderSummary(glider, 'owner', actor.name)] : [];
    }),
  };
}

/** The gliders in the order of their ids. */
async function readable(actor: UserDto, ids: string[]): Promise<Glider[]> {
  const members = await GliderMember.findAll({
    where: { userId: actor.id, gliderId: ids },
    include: [{ association: 'glider', required: true }],
  });
  const byId = new Map(members.map((member) => [member.gliderId, member]));
  return ids.map((id) => {
    const member = byId.get(id);
    if (!member?.glider) throw notFound('glider');
    authorizeGlider(member.role, 'read');
    return member.glider;
  });
}

/** The id of the nth row of a batch, the same however often the batch is asked for: a UUID of version 8 (RFC 9562). */
function idInBatch(batch: string, n: number): string {
  const hex = createHash('sha256').update(`${batch} ${n}`).digest('hex');
  return [
    hex.slice(0, 8),
    hex.slice(8, 12),
    `8${hex.slice(13, 16)}`,
    `8${hex.slice(17, 20)}`,
    hex.slice(20, 32),
  ].join('-');
}

const COPY = ', copy';

function copyName(name: string): string {
  const kept = name.slice(0, LIMITS.name.max - COPY.length);
  // A sign of two halves may have been cut in the middle.
  return `${kept.replace(/\p{Surrogate}$/u, '').trimEnd()}${COPY}`;
}
