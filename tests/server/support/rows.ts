import { randomUUID } from 'node:crypto';
import type { GliderRole } from '#shared/schemas/glider.ts';
import type { MaterialInput } from '#shared/schemas/material.ts';
import { planSchema, type PlanDto } from '#shared/schemas/plan.ts';
import { estimatePlan } from '#server/estimating/estimate-plan.ts';
import { hashToken, newToken } from '#server/auth/tokens.ts';
import { GliderMember } from '#server/models/glider-member.ts';
import { Glider } from '#server/models/glider.ts';
import { Invitation } from '#server/models/invitation.ts';
import { Material } from '#server/models/material.ts';
import type { User } from '#server/models/user.ts';
import { headlineOf } from '#server/services/figures.ts';
import { insertGlider } from '#server/services/gliders.ts';
import { inTransaction } from '#server/services/transaction.ts';
import { planOf, wingOf } from '#tests/support/plans.ts';
import { makeUser } from './people.ts';

/** A small glider: a rectangular wing with twelve ribs and one spar, and a lump of lead in the nose. */
export function smallPlan(changes: Partial<PlanDto> = {}): PlanDto {
  return planSchema.parse(
    planOf(
      [
        wingOf([
          {
            id: 'ribs',
            name: 'Ribs',
            kind: 'ribs',
            material: 'balsa',
            from: 0,
            to: 500,
            count: 12,
            thickness: 1.5,
            lightening: 0,
          },
          {
            id: 'spar',
            name: 'Spar',
            kind: 'strip',
            material: 'hard',
            from: 0,
            to: 500,
            at: [0.3, 0.3],
            seat: 'top',
            width: [5, 5],
            height: [3, 3],
            profile: 'rectangle',
            letIn: true,
          },
        ]),
      ],
      {
        items: [{ id: 'nose', name: 'Nose weight', group: 'ballast', mass: 20, at: [-120, 0, 0] }],
        ...changes,
      },
    ),
  );
}

/** A saved glider, with an owner of its own unless one is given. */
export async function makeGlider({ owner, plan = smallPlan() }: { owner?: User; plan?: PlanDto } = {}) {
  const ownerId = (owner ?? (await makeUser())).id;
  const id = randomUUID();
  const headline = headlineOf(plan, await estimatePlan(plan));
  await inTransaction((transaction) => insertGlider({ id, ownerId, plan, headline, transaction }));
  return Glider.findByPk(id, { rejectOnEmpty: true });
}

export async function addMember(
  glider: Glider,
  user: User,
  role: Exclude<GliderRole, 'owner'>,
): Promise<void> {
  await GliderMember.create({ ownerId: glider.ownerId, gliderId: glider.id, userId: user.id, role });
}

/** An invitation that waits for an answer; nobody knows its link. */
export function makeInvitation(glider: Glider, by: User): Promise<Invitation> {
  return Invitation.create({
    id: randomUUID(),
    ownerId: glider.ownerId,
    gliderId: glider.id,
    email: 'finch@larkmoor.example',
    role: 'pilot',
    tokenHash: hashToken(newToken()),
    invitedBy: by.id,
    expiresAt: new Date(Date.now() + 86_400_000),
  });
}

export const MATERIAL: MaterialInput = {
  name: 'Lime, own stock',
  category: 'wood',
  density: 420,
  areal: null,
  spread: null,
  cv: 0.05,
  modulus: null,
  strength: null,
  moisture: 0.1,
  form: '',
  source: 'Weighed on the kitchen scale',
  basis: 'own measurement',
  shared: false,
};

/** A row of the table: everybody's, or the owner's. */
export async function makeMaterial({
  owner,
  ...changes
}: { owner?: User; name?: string } = {}): Promise<Material> {
  const { shared: _, ...fields } = MATERIAL;
  const key = `lime-${randomUUID()}`;
  return Material.create({ ...fields, ...changes, key, ownerId: owner?.id ?? null });
}

/** A plan that holds a copy of a row. */
export function planWith(material: Material, changes: Partial<PlanDto> = {}): PlanDto {
  const plan = smallPlan(changes);
  const { name, category, cv } = material;
  return {
    ...plan,
    materials: { ...plan.materials, [material.key]: { name, category, cv, density: material.density ?? 1 } },
  };
}
