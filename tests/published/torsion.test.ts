import { describe, expect, it, test } from 'vitest';
import reference from '#data/reference/torsion.json';
import type { Part } from '#shared/core/plan.ts';
import { bredtStiffness, closedNoseOf } from '#shared/core/torsion.ts';
import { planOf, wingOf } from '#tests/support/plans.ts';
import { expectNear, NINE_DIGITS, SAME_SUM } from './tolerance.ts';

test.each(reference.tubes.rows)(`$tube (${reference.tubes.source})`, ({ area, walls, constant }) => {
  const shear = 250;
  const found = bredtStiffness(
    area,
    walls.map((wall) => ({ ...wall, shear })),
  );
  expectNear(found, shear * constant, SAME_SUM);
});

describe('a closed nose', () => {
  const parts: Part[] = [
    {
      id: 'nose',
      name: 'Nose sheeting',
      kind: 'skin',
      material: 'balsa',
      from: 0,
      to: 500,
      seat: 'wrap',
      start: 0.3,
      end: 0.3,
      thickness: 1,
    },
    {
      id: 'web',
      name: 'Web',
      kind: 'web',
      material: 'balsa',
      from: 0,
      to: 500,
      at: [0.3, 0.3],
      thickness: 1,
    },
  ];
  const materials = {
    balsa: { name: 'Balsa', category: 'wood' as const, density: 120, cv: 0.1, modulus: 2, strength: 15 },
  };
  const plate = { flat: 20 };
  const box = (own: Part[]) => {
    const panels = wingOf([]).panels.map((p) => ({ ...p, rootSection: plate, tipSection: plate }));
    return wingOf(own, { panels });
  };
  const plan = planOf([], { materials });

  it(`of a plate is a box without its front wall (${reference.shear.source})`, () => {
    // Chord 200: 60 × 20 mm enclosed by two skins of 60 and a web of 20; a plate's front edge carries no skin.
    const shear = 2000 * reference.shear.ratio * reference.shear.overBending;
    const stiffness = (4 * (60 * 20) ** 2 * shear) / (60 + 60 + 20);
    const found = closedNoseOf(plan, box(parts));
    expectNear(found?.stiffness, stiffness, NINE_DIGITS);
    expectNear(found?.twistPerCouple, 500 / stiffness, NINE_DIGITS);
    expect(found?.to).toBe(500);
  });

  it('ends where its web ends', () => {
    const [nose, web] = parts;
    const short = { ...(web as Extract<Part, { kind: 'web' }>), to: 320 };
    expect(closedNoseOf(plan, box(nose ? [nose, short] : []))?.to).toBe(320);
  });

  it('is none without a web, or with one that stands away from the sheeting’s edge', () => {
    const [nose, web] = parts;
    const away = { ...(web as Extract<Part, { kind: 'web' }>), at: [0.4, 0.4] as [number, number] };
    expect(closedNoseOf(plan, box(nose ? [nose] : []))).toBeNull();
    expect(closedNoseOf(plan, box(nose ? [nose, away] : []))).toBeNull();
  });

  it('of two skins, top and bottom, is as stiff as of one round the nose', () => {
    const [, web] = parts;
    const face = (seat: 'top' | 'bottom'): Part => ({
      id: seat,
      name: seat,
      kind: 'skin',
      material: 'balsa',
      from: 0,
      to: 500,
      seat,
      start: 0,
      end: 0.3,
      thickness: 1,
    });
    const two = closedNoseOf(plan, box(web ? [face('top'), face('bottom'), web] : []));
    expectNear(two?.stiffness, closedNoseOf(plan, box(parts))?.stiffness ?? Number.NaN, SAME_SUM);
  });
});
