import type { Part, Plan, PlanMaterial, Solid, Surface } from '#shared/core/plan.ts';
import { sliceJoints } from './glue.ts';
import { halvesOf, type Half } from './half.ts';
import { Heap } from './heap.ts';
import { sliceCaps, sliceRibs } from './ribs.ts';
import { sliceCovering, sliceSheet, sliceSkin, sliceTipBlock } from './sheets.ts';
import { sliceBar, slicePlate } from './solids.ts';
import { sliceStrip, sliceWeb } from './sticks.ts';
import { summaryOf, type SecondLine, type SecondOpinion } from './summary.ts';
import { addTally, emptyTally, type Tally } from './tally.ts';

/** The estimate once more, by slices and plain sums alone. */
export function secondOpinion(plan: Plan): SecondOpinion {
  const lines = [
    ...plan.surfaces.flatMap((surface) => surfaceLines(plan, surface)),
    ...plan.items.map((item): SecondLine => {
      const heap = new Heap();
      heap.add(item.mass, item.at);
      const sizes = { pieces: 1, length: null, area: null, volume: null, wood: false };
      return {
        ...sizes,
        ...weigh(heap),
        id: `item/${item.id}`,
        group: item.group,
        surface: null,
        u: item.u ?? 0,
      };
    }),
    ...plan.solids.map((solid) =>
      lineOf(
        { id: `solid/${solid.id}`, group: solid.group, surface: null },
        plan.materials[solid.material],
        solid,
        solid.shape === 'bar' ? sliceBar(solid) : slicePlate(solid),
      ),
    ),
  ];
  return { lines, ...summaryOf(plan, lines) };
}

function surfaceLines(plan: Plan, surface: Surface): SecondLine[] {
  const halves = halvesOf(surface);
  const nameOf = (part: Part) => ({
    id: `${surface.key}/${part.id}`,
    group: part.group ?? surface.key,
    surface: surface.key,
  });
  const holders = (part: Part) => halves.filter((half) => half.parts.includes(part));
  const lines = new Map<Part, SecondLine>();
  for (const part of surface.parts) {
    if (part.kind === 'glue' && part.method === 'share') continue;
    const tally = holders(part)
      .map((half) => slicePart(half, part))
      .reduce(addTally, emptyTally());
    lines.set(part, lineOf(nameOf(part), plan.materials[part.material], part, tally));
  }
  const wood = new Heap();
  for (const line of lines.values()) if (line.wood) wood.addAll(line.heap);
  return surface.parts.map((part) => {
    const line = lines.get(part);
    if (line) return line;
    const heap = new Heap();
    heap.addAll(wood, part.kind === 'glue' ? part.share : 0);
    const sizes = { pieces: 1, length: null, area: null, volume: null, wood: false };
    const cv = plan.materials[part.material]?.cv ?? 0;
    return { ...sizes, ...weigh(heap), ...nameOf(part), u: heap.amount * cv };
  });
}

function slicePart(half: Half, part: Part): Tally {
  switch (part.kind) {
    case 'ribs':
      return sliceRibs(half, part);
    case 'strip':
      return sliceStrip(half, part);
    case 'skin':
      return sliceSkin(half, part);
    case 'capStrips':
      return sliceCaps(half, part);
    case 'web':
      return sliceWeb(half, part);
    case 'tipBlock':
      return sliceTipBlock(half, part);
    case 'sheet':
      return sliceSheet(half, part);
    case 'covering':
    case 'finish':
      return sliceCovering(half, part);
    case 'glue':
      return sliceJoints(half);
  }
}

/** Measures that say something of a part of each kind; a strip's area does where its material is sold by area. */
const TOLD: Record<Part['kind'] | Solid['shape'], ('length' | 'area' | 'volume')[]> = {
  ribs: ['area', 'volume'],
  strip: ['length', 'volume'],
  skin: ['area', 'volume'],
  capStrips: ['length', 'area', 'volume'],
  web: ['length', 'area', 'volume'],
  tipBlock: ['length', 'volume'],
  sheet: ['area', 'volume'],
  covering: ['area'],
  finish: ['area'],
  glue: ['area'],
  bar: ['length', 'volume'],
  plate: ['area', 'volume'],
};

/** Density weighs the volume; what is sold by the area, and glue by its spread and layers, weighs the area. */
function lineOf(
  name: Pick<SecondLine, 'id' | 'group' | 'surface'>,
  material: PlanMaterial | undefined,
  part: Part | Solid,
  { pieces, length, area, volume }: Tally,
): SecondLine {
  const kind = 'kind' in part ? part.kind : part.shape;
  const byVolume = material?.density !== undefined && TOLD[kind].includes('volume');
  const layers = 'layers' in part ? (part.layers ?? 1) : 1;
  const heap = new Heap();
  if (byVolume) heap.addAll(volume, (material.density ?? 0) * 1e-6);
  else heap.addAll(area, (material?.areal ?? (material?.spread ?? 0) * layers) * 1e-6);
  const told = (field: 'length' | 'area' | 'volume', value: number) =>
    TOLD[kind].includes(field) || (field === 'area' && !byVolume) ? value : null;
  return {
    ...name,
    ...weigh(heap),
    pieces,
    length: told('length', length),
    area: told('area', area.amount),
    volume: told('volume', volume.amount),
    u: heap.amount * (material?.cv ?? 0),
    wood: material?.category === 'wood',
  };
}

const weigh = (heap: Heap) => ({ heap, mass: heap.amount, at: heap.centre, moment: heap.first[0] });
