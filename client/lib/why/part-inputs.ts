import type { Pair, Part, Plan, Solid, Surface } from '#shared/core/plan.ts';
import type { Line } from '#shared/core/result.ts';
import { formatQuantity } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';
import type { WhyInput } from './why.ts';

/** What somebody entered for a line, each with the field that it stands in. */
export function inputsOf(plan: Plan, line: Line, units: Units): WhyInput[] {
  const at = (field: string) => ({ place: 'drawing' as const, line: line.id, field });
  const own = (name: string, value: string, field = name): WhyInput => ({ name, value, at: at(field) });
  const material = line.material === null ? undefined : plan.materials[line.material];
  const made: WhyInput[] = material ? [own('Material', material.name)] : [];
  const surface = plan.surfaces.find(({ key }) => key === line.surface);
  const part = surface?.parts.find(({ id }) => `${surface.key}/${id}` === line.id);
  if (surface && part) {
    return [...made, ...sizesOf(part, units, own), ...panelsOf(surface, line.id, units)];
  }
  const solid = plan.solids.find(({ id }) => `solid/${id}` === line.id);
  if (solid) return [...made, ...solidSizes(solid, units, own)];
  const item = plan.items.find(({ id }) => `item/${id}` === line.id);
  if (!item) return [];
  return [
    own('Mass', units.format(item.mass, 'mass', { fine: true })),
    ...(item.u === undefined ? [] : [own('±', units.format(item.u, 'mass', { fine: true }), '±, if known')]),
    own('Arm', units.format(item.at[0], 'length'), 'At x, y, z'),
  ];
}

type Own = (name: string, value: string, field?: string) => WhyInput;

const taper = ([a, b]: Pair, units: Units) =>
  a === b ? units.size(a) : `${units.size(a, { bare: true })}–${units.size(b)}`;

function sizesOf(part: Part, units: Units, own: Own): WhyInput[] {
  const share = (value: number) => formatQuantity(value, 'share');
  switch (part.kind) {
    case 'ribs':
      return [own('Thickness', units.size(part.thickness)), own('Cut out', share(part.lightening))];
    case 'strip':
      return [own('Width', taper(part.width, units)), own('Height', taper(part.height, units))];
    case 'skin':
    case 'web':
      return [own('Thickness', units.size(part.thickness))];
    case 'capStrips':
      return [own('Width', units.size(part.width)), own('Thickness', units.size(part.thickness))];
    case 'sheet':
      return [own('Thickness', units.size(part.thickness)), own('Cut out', share(part.cutout))];
    case 'tipBlock':
      return [own('Length', units.size(part.length)), own('Hollowed out', share(part.hollow))];
    case 'covering':
    case 'finish':
      return [own('Overlap', share(part.overlap))];
    case 'glue':
      return part.method === 'share' && part.share !== undefined
        ? [own('Of the wood', formatQuantity(part.share, 'fineShare'))]
        : [];
  }
}

function solidSizes(solid: Solid, units: Units, own: Own): WhyInput[] {
  if (solid.shape === 'plate') return [own('Thickness', units.size(solid.thickness))];
  return [own('Width', taper(solid.width, units)), own('Height', taper(solid.height, units))];
}

/** The panels that a surface is measured along, with the line that brings it to hand. */
export function panelsOf({ key, panels, parts }: Surface, line: string | null, units: Units): WhyInput[] {
  const [first] = parts;
  const bring = line ?? (first ? `${key}/${first.id}` : undefined);
  return panels.map(({ span, rootChord, tipChord }, i) => ({
    name: `Panel ${i + 1} of the ${key}`,
    value: `${units.size(span)} long, chord ${taper([rootChord, tipChord], units)}`,
    at: { place: 'drawing', line: bring, field: `Panel ${i + 1}, span`, surfaceOnly: true },
  }));
}
