import type {
  Pair,
  Panel,
  Part,
  Plan,
  PlanMaterial,
  SectionSpec,
  Strip,
  Surface,
} from '#shared/core/plan.ts';

/** Invented stock; the figures are chosen to be unlike one another, no source. */
const materials: Record<string, PlanMaterial> = {
  balsa: { name: 'Balsa', category: 'wood', density: 130, cv: 0.09 },
  'balsa-hard': { name: 'Balsa, hard', category: 'wood', density: 235, cv: 0.06 },
  spruce: { name: 'Spruce', category: 'wood', density: 440, cv: 0.1 },
  carbon: { name: 'Carbon', category: 'composite', density: 1550, cv: 0.03 },
  ply: { name: 'Thin ply', category: 'sheet', areal: 480, cv: 0.07 },
  tissue: { name: 'Tissue', category: 'covering', areal: 14, cv: 0.05 },
  dope: { name: 'Dope', category: 'finish', areal: 9, cv: 0.25 },
  glue: { name: 'Glue', category: 'adhesive', spread: 85, cv: 0.3 },
};

export const naca = (digits: string): SectionSpec => ({ naca: digits });

export function panel(
  span: number,
  chords: [root: number, tip: number],
  sections: [root: SectionSpec, tip: SectionSpec],
  { sweep = 0, dihedral = 0 }: { sweep?: number; dihedral?: number } = {},
): Panel {
  const [rootChord, tipChord] = chords;
  const [rootSection, tipSection] = sections;
  return { span, rootChord, tipChord, sweep, dihedral, rootSection, tipSection };
}

type OfKind<K> = Part extends infer P
  ? P extends { kind: infer Q }
    ? K extends Q
      ? P
      : never
    : never
  : never;
type Bare<K extends Part['kind']> = Omit<OfKind<K>, 'kind' | 'name' | 'group' | 'material'> & {
  material?: string;
};

/** A part of its kind, named by its id, of balsa unless it says otherwise, its kind as its group. */
export function part<K extends Part['kind']>(kind: K, bare: Bare<K>): Part {
  return { kind, name: bare.id, group: kind, material: 'balsa', ...bare } as unknown as Part;
}

/** A rectangular strip; let in where it lies on a face or in the middle. */
export function strip(
  id: string,
  [from, to]: Pair,
  seat: Strip['seat'],
  at: Pair,
  [width, height]: [width: Pair, height: Pair],
  more: Partial<Strip> = {},
): Part {
  const place = seat === 'nose' || seat === 'tail' ? {} : { at, letIn: true };
  return part('strip', { id, from, to, seat, width, height, profile: 'rectangle', ...place, ...more });
}

export function wing(panels: Panel[], parts: Part[], more: Partial<Surface> = {}): Surface {
  return { key: 'wing', role: 'wing', apex: [0, 0, 0], mirrored: true, panels, parts, ...more };
}

/** A plain sheet tail, so that a plan of one wing has a neutral point too. */
export const sheetTail: Surface = {
  key: 'tailplane',
  role: 'tailplane',
  apex: [520, 0, 15],
  mirrored: true,
  panels: [panel(170, [90, 70], [{ flat: 2.5 }, { flat: 2.5 }], { sweep: 12 })],
  parts: [part('sheet', { id: 'sheet', thickness: 2.5, cutout: 0.2 })],
};

/** A nose and a tail weight stand in for the fuselage, so that balance and inertia are those of a glider. */
const weights: Plan['items'] = [
  { id: 'nose', name: 'Nose weight', group: 'ballast', mass: 25, u: 0.1, at: [-140, 0, -10] },
  { id: 'tail', name: 'Tail weight', group: 'ballast', mass: 4, at: [620, 1, 12] },
];

export function plan(name: string, surfaces: Surface[], more: Partial<Plan> = {}): Plan {
  return { version: 1, name, materials, surfaces, items: weights, solids: [], ...more };
}
