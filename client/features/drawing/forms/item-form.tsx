import type { Item } from '#shared/core/plan.ts';
import { TextOf } from './choice-of.tsx';
import type { Form } from './form.ts';
import { NumberOf } from './number-of.tsx';
import { PlaceOf } from './several-of.tsx';

/** Whatever has a mass and an arm: gear, fittings, ballast. */
export function ItemForm({ form }: { form: Form<Item> }) {
  return (
    <div className="grid gap-y-1.5">
      <TextOf form={form} field="name" label="Name" />
      <NumberOf form={form} field="mass" label="Mass" quantity="mass" />
      <NumberOf form={form} field="u" label="±, if known" quantity="mass" optional />
      <PlaceOf form={form} field="at" label="At x, y, z" />
      <TextOf form={form} field="group" label="Group" />
    </div>
  );
}
