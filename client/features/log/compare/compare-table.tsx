import { Fragment } from 'react';
import { ChangeText } from '#client/components/change-text.tsx';
import { RowTh, Table, Td, Th, Tr } from '#client/components/ui/table.tsx';
import { useUnits } from '#client/lib/units.ts';
import { sheetGroupName } from '#shared/core/sheet-groups.ts';
import { digitsOf, formatNumber, NO_VALUE, roundTo } from '#shared/format/numbers.ts';
import { FINE_EXTRA_DIGITS } from '#shared/format/precision.ts';
import type { Units } from '#shared/format/units.ts';
import { convert } from '#shared/units/units.ts';
import type { ComparedLine, Stood } from './compare-states.ts';

interface CompareTableProps {
  before: Stood;
  after: Stood;
  lines: readonly ComparedLine[];
}

/** Part by part: mass and arm on both sides, and what was changed. */
export function CompareTable({ before, after, lines }: CompareTableProps) {
  const units = useUnits();
  const materials = { ...before.plan.materials, ...after.plan.materials };
  const groups = [...new Set(lines.map(({ group }) => group))];
  const unit = (quantity: 'mass' | 'length') => (
    <span className="font-normal text-graphite">{units.label(quantity)}</span>
  );
  return (
    <Table caption="The two states by part">
      <thead>
        <tr>
          <Th>Part and what changed</Th>
          <Th numeric className="max-sm:hidden">
            Mass before {unit('mass')}
          </Th>
          <Th numeric>
            <span className="sm:hidden">Mass</span>
            <span className="max-sm:hidden">after</span> {unit('mass')}
          </Th>
          <Th numeric>by</Th>
          <Th numeric className="max-sm:hidden">
            Arm before {unit('length')}
          </Th>
          <Th numeric className="max-sm:hidden">
            after {unit('length')}
          </Th>
        </tr>
      </thead>
      <tbody>
        {groups.map((group) => (
          <Fragment key={group}>
            <tr>
              <th scope="rowgroup" colSpan={6} className="caption pt-3 pb-1 text-left">
                {sheetGroupName(group)}
              </th>
            </tr>
            {lines
              .filter((line) => line.group === group)
              .map((line) => (
                <Tr key={line.id}>
                  <RowTh className="py-1.5">
                    {line.name}
                    <span className="block text-note text-graphite">
                      <What line={line} materials={materials} />
                    </span>
                  </RowTh>
                  <Figures
                    units={units}
                    mass={[line.before?.mass ?? null, line.after?.mass ?? null]}
                    arm={[line.before?.at[0] ?? null, line.after?.at[0] ?? null]}
                  />
                </Tr>
              ))}
          </Fragment>
        ))}
        <Tr strong>
          <RowTh className="border-t border-b-0 border-t-strong-rule">Whole model</RowTh>
          <Figures
            total
            units={units}
            mass={[before.result.totals.mass, after.result.totals.mass]}
            arm={[before.result.balance.x, after.result.balance.x]}
          />
        </Tr>
      </tbody>
    </Table>
  );
}

function What({ line, materials }: { line: ComparedLine; materials: Stood['plan']['materials'] }) {
  const { before, after, changes, differs } = line;
  if (before === null) return 'added';
  if (after === null) return 'removed';
  if (changes.length > 0) return <ChangeText bare changes={changes} materials={materials} />;
  return differs ? 'follows from the other changes' : 'as it was';
}

interface FiguresProps {
  units: Units;
  mass: [before: number | null, after: number | null];
  arm: [before: number | null, after: number | null];
  total?: boolean;
}

function Figures({ units, mass, arm, total = false }: FiguresProps) {
  const line = total ? 'border-t border-b-0 border-t-strong-rule' : '';
  const grams = (value: number | null) => units.format(value, 'mass', { bare: true, fine: true });
  const mm = (value: number | null) => units.format(value, 'length', { bare: true });
  // Of the figures as they are printed, so that each row adds up.
  const printed = (value: number | null) => {
    const unit = units.unit('mass') as 'g';
    return roundTo(convert(value ?? 0, 'g', unit), digitsOf('mass', unit) + FINE_EXTRA_DIGITS);
  };
  const difference = printed(mass[1]) - printed(mass[0]);
  return (
    <>
      <Td numeric className={`${line} max-sm:hidden`}>
        {grams(mass[0])}
      </Td>
      <Td numeric className={line}>
        <span className="block text-note font-normal text-graphite sm:hidden">{grams(mass[0])} →</span>
        {grams(mass[1])}
      </Td>
      <Td numeric className={line}>
        {difference === 0
          ? NO_VALUE
          : formatNumber(difference, digitsOf('mass', units.unit('mass')) + FINE_EXTRA_DIGITS, {
              plus: true,
            })}
      </Td>
      <Td numeric className={`${line} max-sm:hidden`}>
        {mm(arm[0])}
      </Td>
      <Td numeric className={`${line} max-sm:hidden`}>
        {mm(arm[1])}
      </Td>
    </>
  );
}
