import { Button } from '#client/components/ui/button.tsx';
import { Select } from '#client/components/ui/select.tsx';
import { RowTh, Table, Td, Th } from '#client/components/ui/table.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Plan } from '#shared/core/plan.ts';
import { sheetGroupName } from '#shared/core/sheet-groups.ts';
import type { TrialWood } from '#shared/core/wood-groups.ts';
import type { Units } from '#shared/format/units.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { TrialDto } from '#shared/schemas/trials.ts';
import type { DrawnGroup } from './woods.ts';

interface WoodChoiceProps {
  plan: Plan;
  groups: readonly DrawnGroup[];
  woods: readonly TrialWood[];
  /** weighed pieces at hand */
  rack: readonly TrialWood[];
  trial: TrialDto;
  /** 1 for the first trial */
  number: number;
  last: boolean;
  full: boolean;
  editable: boolean;
  onTrial: (trial: TrialDto) => void;
  onCopy: () => void;
  onMove: (by: -1 | 1) => void;
  onRemove: () => void;
  onUse: () => void;
}

/** The woods of one trial, by group and by single part, and what can be done with it. */
export function WoodChoice(props: WoodChoiceProps) {
  const { groups, trial, number, last, full, editable, onTrial, onCopy, onMove, onRemove, onUse } = props;
  const empty = Object.keys(trial.materials).length === 0;
  return (
    <section aria-label={`Woods of ${trial.name}`} className="mt-5 max-w-4xl border-l-3 border-l-ink pl-4">
      <div className="flex flex-wrap items-end gap-x-4 gap-y-2">
        <div className="w-80 max-w-full">
          <TextField
            label={`Name of trial ${number}`}
            keepRoom={false}
            value={trial.name}
            readOnly={!editable}
            maxLength={LIMITS.name.max}
            error={trial.name.trim() === '' ? 'A trial needs a name.' : undefined}
            onChange={(event) => onTrial({ ...trial, name: event.target.value })}
          />
        </div>
        {editable && (
          <div className="flex flex-wrap gap-1 print:hidden">
            <Button variant="primary" disabled={empty} onClick={onUse}>
              Make this the plan
            </Button>
            <Button variant="plain" disabled={full} onClick={onCopy}>
              Copy
            </Button>
            <Button variant="plain" disabled={number === 1} onClick={() => onMove(-1)}>
              Move up
            </Button>
            <Button variant="plain" disabled={last} onClick={() => onMove(1)}>
              Move down
            </Button>
            <Button variant="plain" onClick={onRemove}>
              Remove
            </Button>
          </div>
        )}
      </div>
      <Table caption={`Woods of ${trial.name}`} className="mt-3">
        <thead>
          <tr>
            <Th>Group</Th>
            <Th numeric className="max-sm:hidden">
              As drawn
            </Th>
            <Th>Wood</Th>
          </tr>
        </thead>
        <tbody>
          {groups.map((group) => (
            <GroupRows key={group.key} {...props} group={group} />
          ))}
        </tbody>
      </Table>
    </section>
  );
}

function GroupRows({ group, ...props }: WoodChoiceProps & { group: DrawnGroup }) {
  const { plan, trial } = props;
  const units = useUnits();
  const name = sheetGroupName(group.key);
  const own = group.members.filter(({ id }) => trial.materials[id] !== undefined).length;
  return (
    <>
      <tr>
        <RowTh className="py-1">
          {name}
          <span className="block text-label text-graphite sm:hidden">{units.format(group.mass, 'mass')}</span>
        </RowTh>
        <Td numeric className="max-sm:hidden">
          <span className="text-note text-graphite">
            {group.materials.map((key) => plan.materials[key]?.name ?? key).join(' and ')}
          </span>{' '}
          {units.format(group.mass, 'mass')}
        </Td>
        <Td className="w-1/2">
          <Choice {...props} place={group.key} name={name} />
        </Td>
      </tr>
      {group.members.length > 1 && (
        <tr>
          <Td colSpan={3} className="pb-2">
            <details open={own > 0}>
              <summary className="opens text-note">
                {own > 0
                  ? `Single parts of ${name.toLowerCase()}: ${own} of their own wood`
                  : `Single parts of ${name.toLowerCase()}`}
              </summary>
              <ul className="grid gap-x-6 gap-y-1 pl-4 sm:grid-cols-2">
                {group.members.map((member) => (
                  <li key={member.id}>
                    <Choice {...props} place={member.id} name={member.name} shown />
                  </li>
                ))}
              </ul>
            </details>
          </Td>
        </tr>
      )}
    </>
  );
}

function Choice({
  woods,
  rack,
  trial,
  editable,
  onTrial,
  place,
  name,
  shown = false,
}: WoodChoiceProps & { place: string; name: string; shown?: boolean }) {
  const units = useUnits();
  const chosen = trial.materials[place];
  return (
    <Select
      label={shown ? name : `${name}, ${trial.name}`}
      hideLabel={!shown}
      keepRoom={false}
      disabled={!editable}
      value={chosen?.key ?? ''}
      options={[
        { value: '', label: shown ? 'as its group' : 'as drawn' },
        ...optionsOf(woods, rack, chosen, units),
      ]}
      onValue={(key) => onTrial(withChoice(trial, place, [...woods, ...rack], key))}
    />
  );
}

function optionsOf(
  woods: readonly TrialWood[],
  rack: readonly TrialWood[],
  chosen: TrialWood | undefined,
  units: Units,
) {
  const known = chosen === undefined || [...woods, ...rack].some(({ key }) => key === chosen.key);
  const optionOf = ({ key, material }: TrialWood) => ({
    value: key,
    label: `${material.name}, ${units.format(material.density, 'density')}`,
  });
  const table = (known ? woods : [...woods, chosen]).map(optionOf);
  return rack.length === 0
    ? table
    : [...table, { label: 'Weighed, on your rack', options: rack.map(optionOf) }];
}

function withChoice(trial: TrialDto, place: string, woods: readonly TrialWood[], key: string): TrialDto {
  const { [place]: _, ...others } = trial.materials;
  const wood = woods.find((one) => one.key === key);
  return { ...trial, materials: wood ? { ...others, [place]: wood } : others };
}
