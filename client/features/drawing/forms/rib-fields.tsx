import { Select } from '#client/components/ui/select.tsx';
import { useUnits } from '#client/lib/units.ts';
import { ribStations } from '#shared/core/half.ts';
import type { Ribs } from '#shared/core/plan.ts';
import type { Form } from './form.ts';
import { NumberOf } from './number-of.tsx';
import { ParsedField } from './parsed-field.tsx';
import { RangeOf } from './several-of.tsx';
import { parseStations, stationsText } from './station-text.ts';

/** Ribs stand in equal steps or at stations of their own; each can be turned into the other. */
export function RibFields({ form }: { form: Form<Ribs> }) {
  const { value, set, issue, readOnly } = form;
  const units = useUnits();
  const listed = value.stations !== undefined;
  const asList = () =>
    set({ stations: ribStations(value), from: undefined, to: undefined, count: undefined }, 'spacing');
  const asSteps = () => {
    const stations = [...(value.stations ?? [])].sort((a, b) => a - b);
    const [from, to] = [stations[0] ?? 0, stations.at(-1) ?? 0];
    set({ stations: undefined, from, to, count: Math.max(1, stations.length) }, 'spacing');
  };
  return (
    <>
      <Select
        inline
        label="Spacing"
        value={listed ? 'stations' : 'steps'}
        options={[
          { value: 'steps', label: 'Equal steps' },
          { value: 'stations', label: 'At stations' },
        ]}
        error={listed ? undefined : issue('stations')}
        keepRoom={false}
        disabled={readOnly}
        onValue={(next) => (next === 'stations' ? asList() : asSteps())}
      />
      {listed ? (
        <ParsedField
          label={`Stations, ${units.label('length')}`}
          value={value.stations ?? []}
          format={(stations) => stationsText(stations, units)}
          parse={(text) => parseStations(text, units)}
          onValue={(stations) => set({ stations }, 'stations')}
          error={issue('stations') ?? firstOf(value.stations ?? [], (i) => issue(`stations/${i}`))}
          readOnly={readOnly}
        />
      ) : (
        <>
          <RangeOf form={form} from="from" to="to" label="First – last" quantity="length" />
          <NumberOf form={form} field="count" label="Ribs a side" quantity="count" />
        </>
      )}
      <NumberOf form={form} field="thickness" label="Thickness" quantity="length" />
      <NumberOf form={form} field="lightening" label="Cut out" quantity="share" />
    </>
  );
}

function firstOf(list: readonly unknown[], find: (i: number) => string | undefined): string | undefined {
  for (let i = 0; i < list.length; i++) {
    const found = find(i);
    if (found !== undefined) return found;
  }
  return undefined;
}
