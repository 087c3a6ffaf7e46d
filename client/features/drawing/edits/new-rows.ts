import type { Bar, Item, Panel, Plan, Plate, SectionSpec, Surface, SurfaceRole } from '#shared/core/plan.ts';
import { planformOf } from '#shared/core/planform.ts';
import { freshId } from '#shared/plan-start/names.ts';

const whole = (value: number) => Math.round(value);

/** A wing, tailplane or fin in a size and at a place that suit the first wing. */
export function newSurface(plan: Plan, role: SurfaceRole): Surface {
  const wing = plan.surfaces.find((surface) => surface.role === 'wing');
  const { mac, xLeMac, span } = wing ? planformOf(wing) : { mac: 150, xLeMac: 0, span: 1000 };
  const key = freshId(
    role,
    plan.surfaces.map((surface) => surface.key),
  );
  const tailX = whole(xLeMac + 4 * mac);
  const surface = (own: Partial<Panel>, section: SectionSpec, apex: [number, number, number]): Surface => ({
    key,
    role,
    apex,
    mirrored: role !== 'fin',
    panels: [
      {
        span: 500,
        rootChord: 150,
        tipChord: 120,
        sweep: 10,
        dihedral: 0,
        rootSection: section,
        tipSection: section,
        ...own,
      },
    ],
    parts: [],
  });
  switch (role) {
    case 'wing':
      return surface({ dihedral: 5 }, { naca: '4409' }, [0, 0, 0]);
    case 'tailplane': {
      const own = { span: whole(span / 6), rootChord: whole(mac * 0.65), tipChord: whole(mac * 0.5) };
      return surface(own, { flat: 3 }, [tailX, 0, 10]);
    }
    case 'fin': {
      const own = {
        span: whole(mac * 0.8),
        rootChord: whole(mac * 0.65),
        tipChord: whole(mac * 0.4),
        sweep: whole(mac * 0.2),
        dihedral: 90,
      };
      return surface(own, { flat: 3 }, [tailX, 0, 10]);
    }
  }
}

type NewSolid = Omit<Bar, 'id' | 'material'> | Omit<Plate, 'id' | 'material'>;
export type SolidChoice = 'stick' | 'boom' | 'plate';
export const SOLID_CHOICES: readonly { choice: SolidChoice; label: string; wishes: readonly string[] }[] = [
  { choice: 'stick', label: 'Stick or block', wishes: ['balsa-medium', 'spruce'] },
  { choice: 'boom', label: 'Tube', wishes: ['carbon-tube', 'aluminium'] },
  { choice: 'plate', label: 'Plate by its outline', wishes: ['balsa-medium', 'balsa-hard'] },
];

export function newSolid(choice: SolidChoice): NewSolid {
  const bar = { group: 'fuselage', shape: 'bar' } as const;
  switch (choice) {
    case 'stick':
      return {
        ...bar,
        name: 'Stick',
        from: [-150, 0, 0],
        to: [150, 0, 0],
        width: [10, 10],
        height: [10, 10],
        profile: 'rectangle',
      };
    case 'boom':
      return {
        ...bar,
        name: 'Tail boom',
        from: [100, 0, 0],
        to: [600, 0, 0],
        width: [8, 6],
        height: [8, 6],
        profile: 'tube',
        wall: 0.8,
      };
    case 'plate':
      return {
        name: 'Fuselage side',
        group: 'fuselage',
        shape: 'plate',
        outline: [
          [-150, -10],
          [-120, -20],
          [140, -15],
          [140, 2],
          [-150, 8],
        ],
        thickness: 2,
        count: 2,
        y: 0,
        cutout: 0,
      };
  }
}

export const newItem = (): Omit<Item, 'id'> => ({
  name: 'Item',
  group: 'gear',
  mass: 5,
  u: 0.1,
  at: [-50, 0, 0],
});
