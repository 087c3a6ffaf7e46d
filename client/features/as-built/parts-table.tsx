import { RowTh, Table, Td, Th, Tr } from '#client/components/ui/table.tsx';
import { useUnits } from '#client/lib/units.ts';
import { overrunOf } from '#shared/core/built/overrun.ts';
import type { Plan, Part } from '#shared/core/plan.ts';
import type { Units } from '#shared/format/units.ts';
import type { Noted } from '#client/lib/built/account.ts';
import { lineLabel } from './choices.ts';
import type { Built } from '#client/lib/built/use-built.ts';

/** Every part as it stands: on the scale, or as it is forecast now; and why what was weighed ran over. */
export function PartsTable({ built, plan }: { built: Built; plan: Plan }) {
  const units = useUnits();
  const { account, noted, counted } = built;
  const mass = (grams: number) => units.format(grams, 'mass', { bare: true });
  const uOf = new Map(counted.map(({ id, u }) => [id, u]));
  const notes = new Map(noted.map((one) => [one.id, one]));
  return (
    <Table caption="Parts as built" className="mt-2 max-w-4xl">
      <thead>
        <tr>
          <Th>Part</Th>
          <Th numeric>Drawn {units.label('mass')}</Th>
          <Th numeric>Now {units.label('mass')}</Th>
          <Th numeric>Over {units.label('mass')}</Th>
          <Th className="max-sm:hidden">Why</Th>
        </tr>
      </thead>
      <tbody>
        {account.parts.map((part) => {
          const { line, side, estimated, weighing, material } = part;
          const over = part.mass - estimated;
          const note = notes.get(weighing ?? '');
          const why =
            weighing === null || !note
              ? ''
              : material === null
                ? itemWords(over, uOf.get(weighing) ?? 0)
                : whyWords(
                    overrunOf(
                      { estimated, measured: part.mass, u: uOf.get(weighing) ?? 0 },
                      {
                        ...causesOf(note, plan, line, material),
                        cv: plan.materials[material ?? '']?.cv ?? 0,
                      },
                    ),
                    units,
                  );
          return (
            <Tr key={`${line} ${side}`}>
              <RowTh>{lineLabel(plan, part)}</RowTh>
              <Td numeric className="text-graphite">
                {mass(estimated)}
              </Td>
              <Td numeric className={weighing === null ? 'text-graphite' : 'font-semibold'}>
                {mass(part.mass)}
                <span className="sr-only">{weighing === null ? ', forecast' : ', weighed'}</span>
              </Td>
              <Td numeric>{weighing === null ? '' : `${over >= 0 ? '+' : '−'}${mass(Math.abs(over))}`}</Td>
              <Td className="text-note text-graphite max-sm:hidden">{why}</Td>
            </Tr>
          );
        })}
      </tbody>
    </Table>
  );
}

/** Density and thickness over what was drawn; only where one part of one wood lay on the scale. */
function causesOf(
  { input }: Noted,
  plan: Plan,
  line: string,
  material: string | null,
): { density: number | null; thickness: number | null } {
  if (new Set(input.covers.map((cover) => cover.line)).size > 1) return { density: null, thickness: null };
  const drawn = plan.materials[material ?? '']?.density;
  const thick = thicknessOf(plan, line);
  return {
    density: input.density === null || !drawn ? null : input.density / drawn,
    thickness: input.thickness === null || !thick ? null : input.thickness / thick,
  };
}

function thicknessOf(plan: Plan, line: string): number | null {
  const parts: [string, Part][] = plan.surfaces.flatMap(({ key, parts: own }) =>
    own.map((part): [string, Part] => [`${key}/${part.id}`, part]),
  );
  const part = parts.find(([id]) => id === line)?.[1];
  return part && 'thickness' in part ? part.thickness : null;
}

/** Something bought has no wood to blame. */
const itemWords = (over: number, u: number): string =>
  Math.abs(over) <= 2 * u ? 'as drawn' : 'the drawing has another figure for it';

function whyWords(
  { over, density, thickness, rest, likely }: ReturnType<typeof overrunOf>,
  units: Units,
): string {
  const grams = (value: number) => `${value >= 0 ? '+' : '−'}${units.format(Math.abs(value), 'mass')}`;
  if (likely === 'explained' && density === null && thickness === null) return 'as drawn';
  const causes = [
    ...(density === null ? [] : [`${grams(density)} by its density`]),
    ...(thickness === null ? [] : [`${grams(thickness)} by its thickness`]),
  ];
  if (likely === 'explained') return causes.join(', ');
  const left = causes.length > 0 ? `${grams(rest)} left: ` : '';
  const cause =
    likely === 'within_spread'
      ? 'within the wood’s usual spread'
      : over > 0
        ? 'more than the wood’s spread: glue, thickness, or another wood'
        : 'less than the wood’s spread: thinner, sanded, or another wood';
  return [...causes, `${left}${cause}`].join(', ');
}
