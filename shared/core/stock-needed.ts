import { estimate } from './estimate.ts';
import type { Part, Plan, Solid } from './plan.ts';
import type { Line } from './result.ts';

/** What parts are cut from: sheet of a thickness, sticks of a section, or blocks. Lengths mm. */
export type StockForm =
  { form: 'sheet'; thickness: number } | { form: 'stick'; width: number; height: number } | { form: 'block' };

/** Stock of one material and size that a plan takes, net: without offcuts and kerf. */
export type StockNeed = StockForm & {
  /** key in the plan's materials */
  material: string;
  pieces: number;
  /** of sheet, mm²; null of the others */
  area: number | null;
  /** of sticks, mm; null of the others */
  length: number | null;
  /** of blocks, mm³; null of the others */
  volume: number | null;
  /** g, finished */
  mass: number;
};

/** The larger side first, so that a stick is the same whichever way it stands. */
function stick(width: readonly number[], height: readonly number[]): StockForm {
  const sides = [Math.max(...width), Math.max(...height)];
  return { form: 'stick', width: Math.max(...sides), height: Math.min(...sides) };
}

function formOf(part: Part | Solid): StockForm | null {
  if ('shape' in part) {
    return part.shape === 'plate'
      ? { form: 'sheet', thickness: part.thickness }
      : stick(part.width, part.height);
  }
  switch (part.kind) {
    case 'ribs':
    case 'skin':
    case 'web':
    case 'sheet':
      return { form: 'sheet', thickness: part.thickness };
    case 'strip':
      return stick(part.width, part.height);
    case 'capStrips':
      return stick([part.width], [part.thickness]);
    case 'tipBlock':
      return { form: 'block' };
    default:
      return null;
  }
}

function needOf({ material, pieces, mass, volume, length, area }: Line, form: StockForm): StockNeed {
  const none = { area: null, length: null, volume: null };
  const own = { material: material ?? '', pieces, mass };
  switch (form.form) {
    case 'sheet':
      return { ...form, ...own, ...none, area: volume === null ? area : volume / form.thickness };
    case 'stick':
      return { ...form, ...own, ...none, length };
    case 'block':
      return { ...form, ...own, ...none, volume };
  }
}

const order = { sheet: 0, stick: 1, block: 2 };
const sizeOf = (need: StockForm) =>
  need.form === 'sheet' ? need.thickness : need.form === 'stick' ? need.width * 1000 + need.height : 0;

/**
 * Wood, composite and ply that a plan takes, by material and size: area of sheet, length of sticks, volume of
 * blocks, all net. Covering, finish and glue are left out. Sheets first, thin before thick.
 * @throws RangeError when a part or solid names a material that the plan does not hold
 * @example stockNeeded(EXAMPLE_PLAN).map(({ form, length, area }) => [form, length ?? area]) // → [['sheet', 50_000], ['sheet', 11_280], ['stick', 1000], ['stick', 400]]
 */
export function stockNeeded(plan: Plan): StockNeed[] {
  const forms = new Map<string, StockForm>();
  const note = (id: string, part: Part | Solid) => {
    const form = formOf(part);
    if (form) forms.set(id, form);
  };
  for (const { key, parts } of plan.surfaces) for (const part of parts) note(`${key}/${part.id}`, part);
  for (const solid of plan.solids) note(`solid/${solid.id}`, solid);
  const needs = new Map<string, StockNeed>();
  for (const line of estimate(plan).lines) {
    const form = forms.get(line.id);
    if (!form || line.mass <= 0) continue;
    const need = needOf(line, form);
    const key = JSON.stringify([form, line.material]);
    const before = needs.get(key);
    needs.set(key, before ? together(before, need) : need);
  }
  return [...needs.values()].sort(
    (a, b) => order[a.form] - order[b.form] || sizeOf(a) - sizeOf(b) || (a.material < b.material ? -1 : 1),
  );
}

function together(a: StockNeed, b: StockNeed): StockNeed {
  const sum = (one: number | null, other: number | null) => (one === null ? null : one + (other ?? 0));
  return {
    ...a,
    pieces: a.pieces + b.pieces,
    area: sum(a.area, b.area),
    length: sum(a.length, b.length),
    volume: sum(a.volume, b.volume),
    mass: a.mass + b.mass,
  };
}
