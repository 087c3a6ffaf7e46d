import { Select, type OptionGroup } from '#client/components/ui/select.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { MaterialCategory, Plan, PlanMaterial } from '#shared/core/plan.ts';
import type { TableMaterial } from '#client/lib/material-snapshot.ts';
import type { Units } from '#shared/format/units.ts';
import type { Fits } from '#shared/plan-start/fits.ts';
import { choices } from '../edits/materials.ts';

interface MaterialFieldProps {
  materials: Plan['materials'];
  table: readonly TableMaterial[];
  fits: Fits;
  value: string;
  error: string | undefined;
  readOnly: boolean;
  onValue: (choice: TableMaterial) => void;
}

const CATEGORIES: Record<MaterialCategory, string> = {
  wood: 'Wood',
  composite: 'Composite',
  metal: 'Metal',
  sheet: 'Ply and board',
  covering: 'Covering',
  finish: 'Finish',
  adhesive: 'Glue',
};

/** By what a material is weighed, in words. */
export function figureOf({ density, areal, spread }: PlanMaterial, units: Units): string {
  if (density !== undefined) return units.format(density, 'density');
  if (areal !== undefined) return units.format(areal, 'areal');
  return spread === undefined ? '' : units.format(spread, 'spread');
}

/** What a part is made of: the plan's own materials and, besides, those of the materials table. */
export function MaterialField({
  materials,
  table,
  fits,
  value,
  error,
  readOnly,
  onValue,
}: MaterialFieldProps) {
  const units = useUnits();
  const offered = choices({ materials }, table, fits);
  const current = materials[value];
  const all =
    current && !offered.some(({ key }) => key === value)
      ? [{ key: value, material: current }, ...offered]
      : offered;
  const categories = [...new Set(all.map(({ material }) => material.category))];
  const groups = categories.map((category): OptionGroup => ({
    label: CATEGORIES[category],
    options: all
      .filter(({ material }) => material.category === category)
      .map(({ key, material }) => ({ value: key, label: `${material.name}, ${figureOf(material, units)}` })),
  }));
  const missing = current ? [] : [{ value, label: 'Choose a material', disabled: true }];
  return (
    <Select
      inline
      label="Material"
      value={value}
      options={[...missing, ...groups]}
      error={error}
      keepRoom={false}
      disabled={readOnly}
      onValue={(key) => {
        const choice = all.find((other) => other.key === key);
        if (choice) onValue(choice);
      }}
    />
  );
}
