import { Select } from '#client/components/ui/select.tsx';
import type { Strip, StripProfile, StripSeat } from '#shared/core/plan.ts';
import { TickOf } from './choice-of.tsx';
import type { Form } from './form.ts';
import { NumberOf } from './number-of.tsx';
import { PairOf, RangeOf } from './several-of.tsx';

const SEATS: readonly { value: StripSeat; label: string }[] = [
  { value: 'top', label: 'On top' },
  { value: 'bottom', label: 'On the bottom' },
  { value: 'middle', label: 'Middle of the section' },
  { value: 'nose', label: 'Leading edge' },
  { value: 'tail', label: 'Trailing edge' },
];
const PROFILES: readonly { value: StripProfile; label: string }[] = [
  { value: 'rectangle', label: 'Rectangle' },
  { value: 'triangle', label: 'Triangle, thick edge forward' },
  { value: 'round', label: 'Round' },
  { value: 'tube', label: 'Tube' },
];

/** A spar, stringer or edge. What a new seat or profile needs is filled in with it. */
export function StripFields({ form }: { form: Form<Strip> }) {
  const { value, set, issue, readOnly } = form;
  const atEdge = value.seat === 'nose' || value.seat === 'tail';
  const changeSeat = (seat: StripSeat) => {
    const needs = seat !== 'nose' && seat !== 'tail';
    set({ seat, ...(needs && { at: value.at ?? [0.3, 0.3], letIn: value.letIn ?? true }) }, 'seat');
  };
  const changeProfile = (profile: StripProfile) => {
    const thin = Math.min(...value.width, ...value.height) / 8;
    const wall = Math.max(0.1, Math.round(thin * 10) / 10);
    set({ profile, ...(profile === 'tube' && value.wall === undefined && { wall }) }, 'profile');
  };
  return (
    <>
      <Choice
        label="Place"
        value={value.seat}
        options={SEATS}
        onValue={changeSeat}
        readOnly={readOnly}
        error={issue('seat')}
      />
      {!atEdge && <PairOf form={form} field="at" label="At, of the chord" quantity="share" />}
      <RangeOf form={form} from="from" to="to" label="From – to" quantity="length" />
      <PairOf form={form} field="width" label="Width" quantity="length" />
      <PairOf form={form} field="height" label="Height" quantity="length" />
      <Choice
        label="Profile"
        value={value.profile}
        options={PROFILES}
        onValue={changeProfile}
        readOnly={readOnly}
        error={issue('profile')}
      />
      {value.profile === 'tube' && <NumberOf form={form} field="wall" label="Wall" quantity="length" />}
      {!atEdge && <TickOf form={form} field="letIn" label="Let into the ribs" />}
    </>
  );
}

interface ChoiceProps<T extends string> {
  label: string;
  value: T;
  options: readonly { value: T; label: string }[];
  onValue: (value: T) => void;
  readOnly: boolean;
  error: string | undefined;
}

function Choice<T extends string>({ label, value, options, onValue, readOnly, error }: ChoiceProps<T>) {
  return (
    <Select
      inline
      keepRoom={false}
      {...{ label, value, options, error }}
      disabled={readOnly}
      onValue={(next) => {
        const option = options.find((o) => o.value === next);
        if (option) onValue(option.value);
      }}
    />
  );
}
