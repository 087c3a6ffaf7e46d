import { useId } from 'react';
import { AskWhy } from '#client/components/why/ask-why.tsx';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { RowTh, Table, Td, Th, Tr } from '#client/components/ui/table.tsx';
import { cn } from '#client/lib/cn.ts';
import { useUnits } from '#client/lib/units.ts';
import { CASE_NAMES, SPEED_MAX, type CaseRow, type LoadCase, type SpeedCase } from './cases.ts';
import { loadFactorText, marginText, sparStanding } from './words.ts';

interface CaseTableProps {
  rows: readonly CaseRow[];
  shown: LoadCase;
  onShown: (key: LoadCase) => void;
  onSpeed: (key: SpeedCase, speed: number | null) => void;
  /** load factor as it stands in the plan, fit or not */
  stated: number;
  /** null keeps it from being changed */
  onStated: ((n: number) => void) | null;
  /** least margin and rise of the tip, mm, at a load factor */
  marginAt: (n: number) => number | null;
  riseAt: (n: number) => number | null;
  /** station with the least margin, mm */
  worst: number;
}

const LOAD_FACTOR_MAX = 100;

/** Ways of loading the wing side by side; the one picked is drawn. */
export function CaseTable(props: CaseTableProps) {
  const { rows, shown, onShown, onSpeed, stated, onStated, marginAt, riseAt, worst } = props;
  const units = useUnits();
  const group = useId();
  return (
    <Table caption="Load cases">
      <thead>
        <tr>
          <Th>Load case</Th>
          <Th numeric>Speed {units.label('speed')}</Th>
          <Th numeric>Load factor</Th>
          <Th numeric>Margin</Th>
          <Th numeric>Tip rises {units.label('length')}</Th>
        </tr>
      </thead>
      <tbody>
        {rows.map(({ key, speed, loadFactor }) => {
          const { name, note } = CASE_NAMES[key];
          const margin = loadFactor === null ? null : marginAt(loadFactor);
          return (
            <Tr key={key} lit={key === shown}>
              <RowTh className="py-1">
                <label className="flex min-h-row items-center gap-2.5 pl-1.5">
                  <input
                    type="radio"
                    name={group}
                    checked={key === shown}
                    disabled={loadFactor === null}
                    onChange={() => onShown(key)}
                    className="size-4 shrink-0 accent-ink pointer-coarse:size-5"
                  />
                  <span>
                    {name}
                    <span className="block text-note text-graphite max-sm:hidden">{note}</span>
                  </span>
                </label>
              </RowTh>
              <Td numeric className="w-24">
                {key === 'stated' ? (
                  ''
                ) : (
                  <NumberField
                    label={`${name}, speed`}
                    quantity="speed"
                    compact
                    optional
                    min={0}
                    max={SPEED_MAX}
                    value={speed}
                    onChange={(value, problem) => {
                      const fits = value !== null && value >= 0 && value <= SPEED_MAX;
                      if (fits || problem === 'missing') onSpeed(key, value);
                    }}
                  />
                )}
              </Td>
              <Td numeric className="w-24">
                {key === 'stated' ? (
                  <NumberField
                    label="Load factor stated"
                    quantity="ratio"
                    compact
                    step={0.5}
                    value={stated}
                    above={0}
                    max={LOAD_FACTOR_MAX}
                    readOnly={onStated === null}
                    onChange={(value) => {
                      if (value !== null) onStated?.(value);
                    }}
                  />
                ) : (
                  loadFactorText(loadFactor)
                )}
              </Td>
              <Td numeric className="font-semibold">
                {loadFactor === null || margin === null ? (
                  <Margin margin={margin} />
                ) : (
                  <AskWhy question={{ of: 'spar', station: worst, loadFactor }}>
                    <Margin margin={margin} />
                  </AskWhy>
                )}
              </Td>
              <Td numeric>
                {units.format(loadFactor === null ? null : riseAt(loadFactor), 'length', { bare: true })}
              </Td>
            </Tr>
          );
        })}
      </tbody>
    </Table>
  );
}

/** The figure, and a sign and word beside it where it is too small. */
function Margin({ margin }: { margin: number | null }) {
  const standing = margin === null ? 'inside' : sparStanding(margin);
  return (
    <span className={cn(standing === 'outside' && 'text-red', standing === 'close' && 'text-ochre')}>
      {standing === 'outside' && <span aria-hidden="true">▲ </span>}
      {standing === 'close' && <span aria-hidden="true">◆ </span>}
      {marginText(margin)}
      {standing !== 'inside' && (
        <span className="block text-note font-normal">
          {standing === 'outside' ? 'over its strength' : 'close'}
        </span>
      )}
    </span>
  );
}
