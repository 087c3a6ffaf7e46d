import { useMemo, useState, type ReactNode } from 'react';
import { ChangeText } from '#client/components/change-text.tsx';
import { QueryView } from '#client/components/query-view.tsx';
import { Button } from '#client/components/ui/button.tsx';
import { Checkbox } from '#client/components/ui/checkbox.tsx';
import { Select } from '#client/components/ui/select.tsx';
import { effectInWords } from '#client/lib/effect-words.ts';
import { formatMoment } from '#client/lib/moments.ts';
import { useUnits } from '#client/lib/units.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import type { GliderSaveDto } from '#shared/schemas/glider-save.ts';
import { compareStates, type Stood } from './compare-states.ts';
import { CompareTable } from './compare-table.tsx';
import { useStood, type Side } from './use-stood.ts';

interface CompareViewProps {
  workspace: Workspace;
  gliderId: string;
  /** to choose from; there may be older ones */
  saves: readonly GliderSaveDto[];
  from: Side;
  to: Side;
  onChange: (from: Side, to: Side) => void;
  onClose: () => void;
  onBringBack: ((version: number) => void) | undefined;
}

/** Two states of the glider beside each other. */
export function CompareView(props: CompareViewProps) {
  const { workspace, gliderId, saves, from, to, onChange, onClose, onBringBack } = props;
  const before = useStood(gliderId, from, workspace);
  const after = useStood(gliderId, to, workspace);
  const choose = (label: string, side: Side, onSide: (side: Side) => void) => (
    <Select
      label={label}
      inline
      keepRoom={false}
      value={String(side)}
      options={optionsOf(saves, side)}
      onValue={(value) => onSide(value === 'now' ? 'now' : Number(value))}
    />
  );
  const tools = (
    <div className="mt-3 flex flex-wrap items-end gap-x-6 gap-y-2">
      <div className="grid w-full max-w-md gap-y-1.5">
        {choose('Before', from, (side) => onChange(side, to))}
        {choose('After', to, (side) => onChange(from, side))}
      </div>
      <div className="flex flex-wrap gap-2">
        {onBringBack && from !== 'now' && (
          <Button onClick={() => onBringBack(from)}>Bring the one before back</Button>
        )}
        <Button onClick={onClose}>Close the comparison</Button>
      </div>
    </div>
  );
  return (
    <QueryView query={before} otherwise={<Button onClick={onClose}>Close the comparison</Button>}>
      {(was) => (
        <QueryView query={after} otherwise={<Button onClick={onClose}>Close the comparison</Button>}>
          {(is) => (
            <Compared before={was} after={is}>
              {tools}
            </Compared>
          )}
        </QueryView>
      )}
    </QueryView>
  );
}

function Compared({ before, after, children }: { before: Stood; after: Stood; children: ReactNode }) {
  const units = useUnits();
  const [all, setAll] = useState(false);
  const comparison = useMemo(() => compareStates(before, after), [before, after]);
  const { lines, others } = comparison;
  const differing = lines.filter(({ differs }) => differs);
  const parts = differing.length === 1 ? '1 part differs' : `${differing.length} parts differ`;
  const nothing = differing.length === 0 && others.length === 0;
  return (
    <>
      <h1 className="text-figure font-semibold">
        {nothing ? 'The two states are alike' : `${parts}: ${effectInWords(comparison, units)}`}
      </h1>
      {others.length > 0 && (
        <p className="mt-1 max-w-4xl">
          <ChangeText changes={others} materials={{ ...before.plan.materials, ...after.plan.materials }} />
        </p>
      )}
      {children}
      <Checkbox className="mt-3" label={`Show all ${lines.length} parts`} checked={all} onValue={setAll} />
      <CompareTable before={before} after={after} lines={all ? lines : differing} />
    </>
  );
}

function optionsOf(saves: readonly GliderSaveDto[], chosen: Side) {
  const known = chosen === 'now' || saves.some(({ version }) => version === chosen);
  return [
    { value: 'now', label: 'Now, as it lies on the desk' },
    ...saves.map(({ version, savedAt, savedBy, name }) => ({
      value: String(version),
      label: [name, formatMoment(savedAt), savedBy].filter(Boolean).join(' · '),
    })),
    ...(known ? [] : [{ value: String(chosen), label: `State ${chosen}` }]),
  ];
}
