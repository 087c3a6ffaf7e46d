import type { CapStrips, Face, Skin, Web } from '#shared/core/plan.ts';
import { ChoiceOf } from './choice-of.tsx';
import type { Form } from './form.ts';
import { NumberOf } from './number-of.tsx';
import { PairOf, RangeOf } from './several-of.tsx';

export const FACES: readonly { value: Face; label: string }[] = [
  { value: 'both', label: 'Top and bottom' },
  { value: 'top', label: 'Top' },
  { value: 'bottom', label: 'Bottom' },
];
const SKIN_SEATS: readonly { value: Skin['seat']; label: string }[] = [
  { value: 'wrap', label: 'Round the nose' },
  { value: 'top', label: 'Top' },
  { value: 'bottom', label: 'Bottom' },
];

export function SkinFields({ form }: { form: Form<Skin> }) {
  const wraps = form.value.seat === 'wrap';
  return (
    <>
      <ChoiceOf form={form} field="seat" label="Place" options={SKIN_SEATS} />
      <RangeOf form={form} from="from" to="to" label="From – to" quantity="length" />
      <RangeOf
        form={form}
        from="start"
        to="end"
        label={wraps ? 'Back on top – below' : 'Of the chord'}
        quantity="share"
      />
      <NumberOf form={form} field="thickness" label="Thickness" quantity="length" />
    </>
  );
}

export function CapStripFields({ form }: { form: Form<CapStrips> }) {
  return (
    <>
      <ChoiceOf form={form} field="seat" label="Place" options={FACES} />
      <RangeOf form={form} from="from" to="to" label="On ribs from – to" quantity="length" />
      <RangeOf form={form} from="start" to="end" label="Of the chord" quantity="share" />
      <NumberOf form={form} field="width" label="Width" quantity="length" />
      <NumberOf form={form} field="thickness" label="Thickness" quantity="length" />
    </>
  );
}

export function WebFields({ form }: { form: Form<Web> }) {
  return (
    <>
      <RangeOf form={form} from="from" to="to" label="From – to" quantity="length" />
      <PairOf form={form} field="at" label="At, of the chord" quantity="share" />
      <NumberOf form={form} field="thickness" label="Thickness" quantity="length" />
    </>
  );
}
