import { ribStations } from '#shared/core/half.ts';
import type { Item, Pair, Part, Solid } from '#shared/core/plan.ts';
import { formatQuantity } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';

/** Sizes as short as a list allows, without the unit: `5 × 2`, `5–3 × 2–1.5`, `3/16`. */
const sizesIn = (units: Units) => {
  const size = (value: number) => units.size(value, { bare: true });
  const taper = ([a, b]: Pair) => (a === b ? size(a) : `${size(a)}–${size(b)}`);
  return { size, taper };
};
const share = (value: number) => formatQuantity(value, 'share');

export function partSize(part: Part, units: Units): string {
  const { size, taper } = sizesIn(units);
  switch (part.kind) {
    case 'ribs':
      return size(part.thickness);
    case 'strip':
      return part.profile === 'round' || part.profile === 'tube'
        ? `⌀ ${taper(part.width)}`
        : `${taper(part.width)} × ${taper(part.height)}`;
    case 'skin':
    case 'web':
    case 'sheet':
      return size(part.thickness);
    case 'capStrips':
      return `${size(part.width)} × ${size(part.thickness)}`;
    case 'tipBlock':
      return `${size(part.length)} long`;
    case 'covering':
    case 'finish':
      return part.seat;
    case 'glue':
      return part.method === 'joints' ? 'joints' : share(part.share ?? 0);
  }
}

/** What stands small behind a part's name. */
export function partNote(part: Part): string {
  const side = part.side === 'port' || part.side === 'starboard' ? part.side : '';
  if (part.kind !== 'ribs') return side;
  return [`${ribStations(part).length} a side`, side].filter(Boolean).join(', ');
}

export function solidSize(solid: Solid, units: Units): string {
  const { size, taper } = sizesIn(units);
  if (solid.shape === 'plate') {
    return solid.count > 1 ? `${solid.count} × ${size(solid.thickness)}` : size(solid.thickness);
  }
  const round = solid.profile !== 'rectangle';
  return round ? `⌀ ${taper(solid.width)}` : `${taper(solid.width)} × ${taper(solid.height)}`;
}

/** Where an item sits along the model. */
export function itemPlace(item: Item, units: Units): string {
  return `at ${units.size(item.at[0], { bare: true })}`;
}
