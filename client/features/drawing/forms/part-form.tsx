import { useUnits } from '#client/lib/units.ts';
import type { Part, Plan, PlanMaterial, Side } from '#shared/core/plan.ts';
import type { TableMaterial } from '#client/lib/material-snapshot.ts';
import { fitsPart } from '#shared/plan-start/fits.ts';
import { Fold } from '../fold.tsx';
import { ChoiceOf, TextOf } from './choice-of.tsx';
import type { Form } from './form.ts';
import { figureOf, MaterialField } from './material-field.tsx';
import { PartFields } from './part-fields.tsx';

const SIDES: readonly { value: Side; label: string }[] = [
  { value: 'both', label: 'Both' },
  { value: 'port', label: 'Port only' },
  { value: 'starboard', label: 'Starboard only' },
];

interface PartFormProps {
  form: Form<Part>;
  mirrored: boolean;
  materials: Plan['materials'];
  table: readonly TableMaterial[];
  onMaterial: (choice: TableMaterial) => void;
}

/** Everything that can be said of a part of a surface. */
export function PartForm(props: PartFormProps) {
  const { form, mirrored, materials, table, onMaterial } = props;
  const { value, issue, readOnly } = form;
  return (
    <div className="grid gap-y-1.5">
      <TextOf form={form} field="name" label="Name" />
      <MaterialField
        materials={materials}
        table={table}
        fits={fitsPart(value)}
        value={value.material}
        error={issue('material')}
        readOnly={readOnly}
        onValue={onMaterial}
      />
      <PartFields form={form} />
      {mirrored && <ChoiceOf form={form} field="side" label="Halves" options={SIDES} otherwise="both" />}
      <GroupField form={form} />
      <SourceNote material={materials[value.material]} />
    </div>
  );
}

/** Parts of one group are summed together and, in a trial, change their wood together. */
function GroupField({ form }: { form: Form<Part> }) {
  const { value, set, issue, readOnly } = form;
  const shown: Form<{ group: string }> = {
    value: { group: value.group ?? '' },
    set: ({ group }) => set({ group: group === '' ? undefined : group }, 'group'),
    issue,
    readOnly,
  };
  return <TextOf form={shown} field="group" label="Group" />;
}

/** Where the figure of the material comes from, one press away. */
export function SourceNote({ material }: { material: PlanMaterial | undefined }) {
  const units = useUnits();
  if (!material?.source) return null;
  return (
    <Fold quiet summary={`${material.name}, ${figureOf(material, units)}: where from`}>
      <p className="pb-1 text-note text-graphite">{material.source}</p>
    </Fold>
  );
}
