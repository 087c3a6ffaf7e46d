import type { ReactNode } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Select } from '#client/components/ui/select.tsx';
import { RowTh, Table, Td, Th, Tr } from '#client/components/ui/table.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Plan } from '#shared/core/plan.ts';
import { sheetGroupName } from '#shared/core/sheet-groups.ts';
import type { TrialWood } from '#shared/core/wood-groups.ts';
import type { Trial, TrialResult } from '#shared/core/wood-trial.ts';
import type { Units } from '#shared/format/units.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { TrialFigures } from './trial-figures.tsx';
import type { DrawnGroup } from './woods.ts';

interface TrialTableProps {
  plan: Plan;
  groups: readonly DrawnGroup[];
  woods: readonly TrialWood[];
  trials: readonly Trial[];
  /** what the results are of: as drawn first, then one for each trial */
  tried: readonly Trial[];
  results: readonly TrialResult[];
  /** where the ballast is put, mm */
  arm: number;
  onChange: (index: number, trial: Trial) => void;
  onRemove: (index: number) => void;
  onUse: (trial: Trial) => void;
  canEdit: boolean;
}

/** Woods by group and what they come to, one trial beside the other. */
export function TrialTable(props: TrialTableProps) {
  const { plan, groups, woods, trials, tried, results, arm, onChange, onRemove, onUse, canEdit } = props;
  const units = useUnits();
  const columns = (cell: (trial: Trial, index: number) => ReactNode) =>
    trials.map((trial, index) => (
      <Td key={index} className="min-w-38 sm:min-w-56">
        {cell(trial, index)}
      </Td>
    ));
  return (
    <Table caption="Wood trials side by side" style={{ maxWidth: `${27 + 17 * trials.length}rem` }}>
      <thead>
        <tr>
          <Th className="sticky left-0 z-1 bg-sheet">Group</Th>
          <Th>As drawn</Th>
          {trials.map((trial, index) => (
            <Th key={index} className="py-1">
              <TextField
                label={`Name of trial ${index + 1}`}
                hideLabel
                keepRoom={false}
                value={trial.name}
                maxLength={LIMITS.name.max}
                onChange={(event) => onChange(index, { ...trial, name: event.target.value })}
              />
            </Th>
          ))}
        </tr>
      </thead>
      <tbody>
        {groups.map((group) => (
          <tr key={group.key}>
            <RowTh className="sticky left-0 z-1 bg-sheet max-sm:py-1 max-sm:text-note">
              {sheetGroupName(group.key)}
              <span className="text-note text-graphite max-sm:block sm:ml-2">
                {units.format(group.mass, 'mass')}
              </span>
            </RowTh>
            <Td className="text-note sm:min-w-40">
              {group.materials.map((key) => plan.materials[key]?.name ?? key).join(' and ')}
            </Td>
            {columns((trial, index) => (
              <Select
                label={`${sheetGroupName(group.key)}, ${trial.name}`}
                hideLabel
                keepRoom={false}
                value={trial.materials[group.key]?.key ?? ''}
                options={[
                  { value: '', label: 'as drawn' },
                  ...optionsOf(woods, trial.materials[group.key], units),
                ]}
                onValue={(key) => onChange(index, withChoice(trial, group.key, woods, key))}
              />
            ))}
          </tr>
        ))}
      </tbody>
      <TrialFigures trials={tried} results={results} arm={arm} />
      <tbody>
        <Tr>
          <RowTh className="sticky left-0 z-1 border-b-0 bg-sheet">
            <span className="sr-only">What to do</span>
          </RowTh>
          <Td className="border-b-0" />
          {trials.map((trial, index) => (
            <Td key={index} className="border-b-0 py-2">
              <div className="flex flex-wrap justify-end gap-2">
                <Button variant="plain" onClick={() => onRemove(index)}>
                  Remove
                </Button>
                {canEdit && (
                  <Button disabled={Object.keys(trial.materials).length === 0} onClick={() => onUse(trial)}>
                    Use this wood
                  </Button>
                )}
              </div>
            </Td>
          ))}
        </Tr>
      </tbody>
    </Table>
  );
}

function optionsOf(woods: readonly TrialWood[], chosen: TrialWood | undefined, units: Units) {
  const known = chosen === undefined || woods.some(({ key }) => key === chosen.key);
  return (known ? woods : [...woods, chosen]).map(({ key, material }) => ({
    value: key,
    label: `${material.name}, ${units.format(material.density, 'density')}`,
  }));
}

function withChoice(trial: Trial, group: string, woods: readonly TrialWood[], key: string): Trial {
  const { [group]: _, ...others } = trial.materials;
  const wood = woods.find((one) => one.key === key);
  return { ...trial, materials: wood ? { ...others, [group]: wood } : others };
}
