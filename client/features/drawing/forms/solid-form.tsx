import { useUnits } from '#client/lib/units.ts';
import type { Bar, Plan, Plate, Solid } from '#shared/core/plan.ts';
import type { TableMaterial } from '#client/lib/material-snapshot.ts';
import { fitsSolid } from '#shared/plan-start/fits.ts';
import { ChoiceOf, TextOf } from './choice-of.tsx';
import type { Form } from './form.ts';
import { MaterialField } from './material-field.tsx';
import { NumberOf } from './number-of.tsx';
import { outlineText, parseOutline } from './outline-text.ts';
import { ParsedField } from './parsed-field.tsx';
import { SourceNote } from './part-form.tsx';
import { PairOf, PlaceOf } from './several-of.tsx';

interface SolidFormProps {
  form: Form<Solid>;
  materials: Plan['materials'];
  table: readonly TableMaterial[];
  onMaterial: (choice: TableMaterial) => void;
}

/** A stick, block, tube or plate outside a surface. */
export function SolidForm(props: SolidFormProps) {
  const { form, materials, table, onMaterial } = props;
  const { value, issue, readOnly } = form;
  return (
    <div className="grid gap-y-1.5">
      <TextOf form={form} field="name" label="Name" />
      <MaterialField
        materials={materials}
        table={table}
        fits={fitsSolid(value)}
        value={value.material}
        error={issue('material')}
        readOnly={readOnly}
        onValue={onMaterial}
      />
      {value.shape === 'bar' ? (
        <BarFields form={{ ...form, value }} />
      ) : (
        <PlateFields form={{ ...form, value }} />
      )}
      <TextOf form={form} field="group" label="Group" />
      <SourceNote material={materials[value.material]} />
    </div>
  );
}

const PROFILES: readonly { value: Bar['profile']; label: string }[] = [
  { value: 'rectangle', label: 'Rectangle' },
  { value: 'round', label: 'Round' },
  { value: 'tube', label: 'Tube' },
];

function BarFields({ form }: { form: Form<Bar> }) {
  const { value, set } = form;
  const withWall: Form<Bar> = {
    ...form,
    set: (changes, field) =>
      set(
        { ...changes, ...(changes.profile === 'tube' && value.wall === undefined && { wall: 0.5 }) },
        field,
      ),
  };
  return (
    <>
      <PlaceOf form={form} field="from" label="From x, y, z" />
      <PlaceOf form={form} field="to" label="To x, y, z" />
      <PairOf form={form} field="width" label="Width" quantity="length" />
      <PairOf form={form} field="height" label="Height" quantity="length" />
      <ChoiceOf form={withWall} field="profile" label="Profile" options={PROFILES} />
      {value.profile === 'tube' && <NumberOf form={form} field="wall" label="Wall" quantity="length" />}
    </>
  );
}

function PlateFields({ form }: { form: Form<Plate> }) {
  const { value, set, issue, readOnly } = form;
  const units = useUnits();
  const bad = value.outline.map((_, i) => issue(`outline/${i}/0`) ?? issue(`outline/${i}/1`));
  return (
    <>
      <ParsedField
        label="Outline x, z"
        hint="Corners in order, parted by semicolons."
        value={value.outline}
        format={(outline) => outlineText(outline, units)}
        parse={(text) => parseOutline(text, units)}
        onValue={(outline) => set({ outline }, 'outline')}
        error={issue('outline') ?? bad.find((text) => text !== undefined)}
        readOnly={readOnly}
      />
      <NumberOf form={form} field="thickness" label="Thickness" quantity="length" />
      <NumberOf form={form} field="count" label="Pieces" quantity="count" />
      <NumberOf form={form} field="y" label="y of their middle" quantity="length" />
      <NumberOf form={form} field="cutout" label="Cut out" quantity="share" />
    </>
  );
}
