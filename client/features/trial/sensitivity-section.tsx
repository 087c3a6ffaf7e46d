import { memo } from 'react';
import { RowTh, Table, Td, Th, Tr } from '#client/components/ui/table.tsx';
import { useUnits } from '#client/lib/units.ts';
import { perDensity, perGram, type GramEffect } from '#shared/core/sensitivity.ts';
import type { TrialBase } from '#shared/core/wood-trial-base.ts';
import { wantedPercent } from '#shared/core/wood-trial.ts';
import { formatNumber, NARROW_SPACE } from '#shared/format/numbers.ts';

/** Rows shown before the rest is asked for. */
const SHOWN = 8;

/** Where a gram or a tenth of density costs most, with the ballast that it asks for. */
export const SensitivitySection = memo(Sensitivity);

function Sensitivity({ base, arm }: { base: TrialBase; arm: number }) {
  const units = useUnits();
  if (base.wanted === null) return null;
  const trim = { arm, wanted: base.wanted };
  const parts = perGram(base.fold, trim);
  const materials = perDensity(base.fold, trim);
  const signed = (value: number | null, quantity: 'mass' | 'length') =>
    units.format(value, quantity, { plus: true, fine: true });
  const [dearest] = parts;
  const percent = wantedPercent(base);
  const nameOf = (key: string) => base.plan.materials[key]?.name ?? key;
  const rows = parts.map((part) => {
    const { id, mass, shift, ballast, allUp } = part;
    return (
      <Tr key={id}>
        <RowTh>{partName(part)}</RowTh>
        <Td numeric>{units.format(mass, 'mass')}</Td>
        <Td numeric>{signed(shift, 'length')}</Td>
        <Td numeric>{signed(ballast, 'mass')}</Td>
        <Td numeric>{signed(allUp, 'mass')}</Td>
      </Tr>
    );
  });
  const head = (first: string, shift: string) => (
    <thead>
      <tr>
        <Th>{first}</Th>
        <Th numeric>Mass</Th>
        <Th numeric>{shift}</Th>
        <Th numeric>Ballast</Th>
        <Th numeric>All up</Th>
      </tr>
    </thead>
  );
  return (
    <section aria-labelledby="sensitivity" className="mt-10 border-t border-rule pt-6">
      <h2 id="sensitivity" className="text-heading font-semibold">
        {dearest
          ? `${units.format(1, 'mass')} more on ${partName(dearest)} costs ${units.format(dearest.allUp, 'mass')} all up`
          : 'What a gram costs'}
      </h2>
      <p className="mt-1 max-w-3xl text-graphite">
        The plan as drawn without its ballast, trimmed at {units.format(arm, 'length')} to{' '}
        {percent === null
          ? units.format(base.wanted, 'length')
          : `${formatNumber(percent, 1)}${NARROW_SPACE}% MAC`}
        . Plus is aft, and heavier; what lies before the wanted point saves ballast.
      </p>
      <div className="mt-4 grid grid-cols-1 items-start gap-x-12 gap-y-8 xl:grid-cols-2">
        <div>
          <Table caption={`For each ${units.format(1, 'mass')} more on a part`} showCaption>
            {head('Part', 'Balance')}
            <tbody>{rows.slice(0, SHOWN)}</tbody>
          </Table>
          {rows.length > SHOWN && (
            <details className="mt-1">
              <summary className="opens text-note">The other {rows.length - SHOWN}</summary>
              <Table caption={`For each ${units.format(1, 'mass')} more on the other parts`}>
                {head('Part', 'Balance')}
                <tbody>{rows.slice(SHOWN)}</tbody>
              </Table>
            </details>
          )}
        </div>
        <Table caption={`For 10${NARROW_SPACE}% more density of a material`} showCaption>
          {head('Material', 'Balance')}
          <tbody>
            {materials.map(({ material, mass, shift, ballast, allUp }) => (
              <Tr key={material}>
                <RowTh>{nameOf(material)}</RowTh>
                <Td numeric>{units.format(mass, 'mass')}</Td>
                <Td numeric>{signed(shift, 'length')}</Td>
                <Td numeric>{signed(ballast, 'mass')}</Td>
                <Td numeric>{signed(allUp, 'mass')}</Td>
              </Tr>
            ))}
          </tbody>
        </Table>
      </div>
    </section>
  );
}

/** Two surfaces may have a spar each. */
function partName({ name, surface }: GramEffect): string {
  return surface === null ? name : `${name}, ${surface}`;
}
