import { gramsOfArea } from '#shared/core/frame.ts';
import type {
  Glue,
  Part,
  Pair,
  Plan,
  PlanMaterial,
  SectionSpec,
  Solid,
  Strip,
  Surface,
} from '#shared/core/plan.ts';
import type { Line } from '#shared/core/result.ts';
import { formatNumber, formatQuantity, MINUS } from '#shared/format/numbers.ts';
import type { Units } from '#shared/format/units.ts';

/** What a part is made of, in words with its numbers: the measure that its material's figure multiplies. */
export interface Making {
  /** `25.94 cm³` or `319.3 cm²`, null where the mass comes another way */
  measure: string | null;
  /** what the mass is, where it is no measure times a figure of its material */
  product?: string;
  /** how the measure comes about */
  steps: string[];
}

/** The words of one reader's units. */
interface Say {
  units: Units;
  size: (mm: number) => string;
  /** along a part */
  run: (mm: number) => string;
  area: (mm2: number) => string;
}

const sayIn = (units: Units): Say => ({
  units,
  size: (value) => units.size(value),
  run: (value) => units.format(value, 'length'),
  area: (value) => units.format(value, 'area', { small: true }),
});
const percent = (share: number) => formatQuantity(share, 'share');
const pieces = (count: number, one: string, many: string) => `${count} ${count === 1 ? one : many}`;

/** How a part of a surface measures up. */
export function makingOfPart(plan: Plan, surface: Surface, part: Part, line: Line, units: Units): Making {
  const say = sayIn(units);
  if (part.kind === 'glue') return makingOfGlue(plan, part, line, say);
  return { measure: measureOf(line, say), steps: partSteps(surface, part, line, say) };
}

function measureOf({ volume, area: mm2 }: Line, { units, area }: Say): string | null {
  if (volume !== null) return units.format(volume, 'volume');
  return mm2 === null ? null : area(mm2);
}

function partSteps(surface: Surface, part: Exclude<Part, Glue>, line: Line, say: Say): string[] {
  const { size, run, area } = say;
  const of = line.area === null ? '' : area(line.area);
  switch (part.kind) {
    case 'ribs':
      return [
        `${pieces(line.pieces, 'rib', 'ribs')}, together ${of} of section × ${size(part.thickness)}.`,
        `The section at each station (${sectionsOf(surface, say)}), less what edges, sheeting and caps take up, less the notches of let-in strips${part.lightening > 0 ? `, less ${percent(part.lightening)} lightening` : ''}.`,
      ];
    case 'strip':
      return [
        `${pieces(line.pieces, 'piece', 'pieces')}, together ${run(line.length ?? 0)} along the strip's own line × ${crossSection(part, say)}.`,
      ];
    case 'skin':
      return [
        `${of} of surface × ${size(part.thickness)}.`,
        `Developed length of the section (${sectionsOf(surface, say)}) ${part.seat === 'wrap' ? `from ${percent(part.start)} on top round the nose to ${percent(part.end)} below` : `from ${percent(part.start)} to ${percent(part.end)} on the ${part.seat}`}, along ${run(part.to - part.from)} of span.`,
      ];
    case 'capStrips':
      return [
        `${pieces(line.pieces, 'strip', 'strips')}, together ${run(line.length ?? 0)} × ${size(part.width)} × ${size(part.thickness)}.`,
      ];
    case 'web':
      return [
        `${of} × ${size(part.thickness)}: the section's height at the web, less spars, sheeting and the ribs that interrupt it.`,
      ];
    case 'tipBlock':
      return [
        `${pieces(line.pieces, 'half ellipsoid', 'half ellipsoids')}: ⅔ × last section × ${size(part.length)}${part.hollow > 0 ? ` × (1 ${MINUS} ${percent(part.hollow)} hollowed)` : ''}.`,
      ];
    case 'sheet':
      return [
        `The whole planform × ${size(part.thickness)}${part.cutout > 0 ? ` × (1 ${MINUS} ${percent(part.cutout)} cut out)` : ''}.`,
      ];
    case 'covering':
    case 'finish':
      return [
        `Developed surface, ${part.seat === 'both' ? 'top and bottom' : part.seat}, with tips${part.overlap > 0 ? ` and ${percent(part.overlap)} for overlaps` : ''}.`,
      ];
  }
}

function makingOfGlue(plan: Plan, part: Glue, line: Line, { units, area }: Say): Making {
  if (part.method === 'share') {
    const wood = part.share ? line.mass / part.share : 0;
    return {
      measure: null,
      product: `${formatQuantity(part.share ?? 0, 'fineShare')} of ${units.format(wood, 'mass', { fine: true })} of wood`,
      steps: ["A share of this surface's wood, placed at the wood's centre of mass."],
    };
  }
  const spread = plan.materials[part.material]?.spread ?? 0;
  const layers = part.layers ?? 1;
  const one = gramsOfArea(1, spread * layers);
  return {
    measure: null,
    product: `${area(one > 0 ? line.mass / one : 0)} of joints × ${units.format(spread, 'spread')}${layers === 1 ? '' : ` × ${formatNumber(layers, Number.isInteger(layers) ? 0 : 1)} layers`}`,
    steps: ['Joints: ribs on strips, sheeting on ribs and strips, tips on the last section.'],
  };
}

/** How a stick, block or plate outside the surfaces measures up. */
export function makingOfSolid(solid: Solid, line: Line, units: Units): Making {
  const say = sayIn(units);
  const { size, run } = say;
  if (solid.shape === 'bar') {
    return {
      measure: measureOf(line, say),
      steps: [`${run(line.length ?? 0)} long × ${crossSection(solid, say)}.`],
    };
  }
  const cut = solid.cutout > 0 ? ` × (1 ${MINUS} ${percent(solid.cutout)} cut out)` : '';
  return {
    measure: measureOf(line, say),
    steps: [`${pieces(solid.count, 'plate', 'plates')} by outline${cut} × ${size(solid.thickness)}.`],
  };
}

interface CrossSection {
  width: Pair;
  height: Pair;
  profile: Strip['profile'];
  wall?: number | undefined;
}

function crossSection({ width, height, profile, wall }: CrossSection, { units, size }: Say): string {
  const at = (i: 0 | 1) => `${units.size(width[i], { bare: true })} × ${size(height[i])}`;
  const tapered = width[0] !== width[1] || height[0] !== height[1];
  const shape = {
    rectangle: '',
    triangle: ' triangle',
    round: ' round',
    tube: ` tube, wall ${size(wall ?? 0)}`,
  }[profile];
  return `${tapered ? `${at(0)} tapering to ${at(1)}` : at(0)}${shape}`;
}

function sectionsOf({ panels }: Surface, say: Say): string {
  const names = new Set(
    panels
      .flatMap(({ rootSection, tipSection }) => [rootSection, tipSection])
      .map((section) => sectionName(section, say)),
  );
  const naca = [...names].some((name) => name.startsWith('NACA'));
  return `${[...names].join(' to ')}${naca ? ', ordinates by NACA Report 460' : ''}`;
}

function sectionName(section: SectionSpec, { size }: Say): string {
  if ('naca' in section) return `NACA ${section.naca}`;
  return 'flat' in section ? `flat ${size(section.flat)}` : section.name;
}

/** Density or areal mass, as the formula multiplies it. */
export function figureOf({ density, areal }: PlanMaterial, byArea: boolean, units: Units): string {
  if (!byArea && density !== undefined) return units.format(density, 'density');
  return units.format(areal ?? 0, 'areal');
}
