import { useId, useMemo, useRef, useState, type FormEvent } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { useKept } from '#client/hooks/use-kept.ts';
import { useUnits } from '#client/lib/units.ts';
import type { Plan } from '#shared/core/plan.ts';
import type { WeighingInput } from '#shared/schemas/weighing.ts';
import { choicesOf, chosen } from './choices.ts';
import { MoreFields, NO_MORE, type More } from './more-fields.tsx';
import { ScaleButton } from './scale-button.tsx';
import { scaleKept, USUAL_SCALE } from './scale-kept.ts';

interface WeighFormProps {
  plan: Plan;
  gliderId: string;
  gliderVersion: number;
  /** @throws where the device cannot keep it */
  onNote: (input: WeighingInput) => void;
  /** what the last one came to, said to whoever listens */
  said: string;
}

/** For the bench: pick or scan, type what the scale shows, Enter, next. */
export function WeighForm({ plan, gliderId, gliderVersion, onNote, said }: WeighFormProps) {
  const units = useUnits();
  const list = useId();
  const choices = useMemo(() => choicesOf(plan), [plan]);
  const [scale, keepScale] = useKept('featherbeam.scale', scaleKept, USUAL_SCALE);
  const [what, setWhat] = useState('');
  const [values, setValues] = useState<number[]>([]);
  const [reading, setReading] = useState<number | null>(null);
  const [more, setMore] = useState<More>(NO_MORE);
  const [problem, setProblem] = useState<string | null>(null);
  const whatField = useRef<HTMLInputElement>(null);
  const readingField = useRef<HTMLInputElement>(null);
  const choice = chosen(choices, what);

  const repeat = () => {
    if (reading === null) return;
    setValues((before) => [...before, reading]);
    setReading(null);
    readingField.current?.focus();
  };
  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (!choice) {
      setProblem(
        what.trim() === ''
          ? 'Pick what lies on the scale.'
          : 'That means no part, or several: pick one of the list.',
      );
      whatField.current?.focus();
      return;
    }
    // A scanner ends with Enter as well: with the part known the reading comes next.
    const all = reading === null ? values : [...values, reading];
    if (all.length === 0) {
      setProblem(null);
      readingField.current?.focus();
      return;
    }
    if (all.some((value) => value < scale.tare)) {
      setProblem('The scale showed less than the tare.');
      return;
    }
    try {
      onNote({
        title: choice.label,
        stage: choice.stage,
        covers: choice.covers,
        values: all,
        ...scale,
        x: more.x,
        density: more.density,
        thickness: more.thickness,
        photoId: more.photo?.id ?? null,
        note: more.note,
        gliderVersion,
        weighedAt: new Date().toISOString(),
        corrects: null,
        reason: '',
        withdraws: false,
      });
    } catch {
      setProblem('This browser cannot keep it: its storage is full or shut. Nothing was written down.');
      return;
    }
    setProblem(null);
    setWhat('');
    setValues([]);
    setReading(null);
    setMore(NO_MORE);
    whatField.current?.focus();
  };
  return (
    <form
      onSubmit={submit}
      noValidate
      aria-label="Weigh"
      className="mt-6 border-y border-rule py-4 print:hidden"
    >
      <div className="grid grid-cols-1 items-start gap-x-6 md:grid-cols-[minmax(0,2fr)_minmax(0,1fr)_auto]">
        <TextField
          label="On the scale"
          hint={
            choice && choice.label !== what ? choice.label : 'Pick, type part of its name, or scan its label.'
          }
          error={problem ?? undefined}
          list={list}
          autoComplete="off"
          value={what}
          inputRef={whatField}
          onChange={({ currentTarget }) => {
            setWhat(currentTarget.value);
            setProblem(null);
          }}
        />
        <datalist id={list}>
          {choices.map(({ code, label }) => (
            <option key={code} value={label}>
              {label}
            </option>
          ))}
        </datalist>
        <NumberField
          label="It shows"
          quantity="mass"
          value={reading}
          min={0}
          max={100_000}
          optional
          inputRef={readingField}
          hint={
            values.length > 0
              ? `before: ${values.map((value) => units.format(value, 'mass')).join(', ')}`
              : undefined
          }
          onChange={(value) => setReading(value)}
        />
        <div className="flex flex-wrap items-center gap-2 md:pt-6">
          <Button type="submit" variant="primary">
            Write it down
          </Button>
          <Button variant="plain" onClick={repeat} disabled={reading === null}>
            Weigh again
          </Button>
        </div>
      </div>
      <div className="flex flex-wrap items-end gap-x-6">
        <div className="w-36">
          <NumberField
            label="Scale’s smallest step"
            quantity="mass"
            value={scale.resolution}
            above={0}
            max={100}
            onChange={(value) => value !== null && value > 0 && keepScale({ ...scale, resolution: value })}
          />
        </div>
        <div className="w-36">
          <NumberField
            label="Tare on it"
            quantity="mass"
            value={scale.tare}
            min={0}
            max={10_000}
            onChange={(value) => value !== null && keepScale({ ...scale, tare: value })}
          />
        </div>
        <div className="pb-6">
          <ScaleButton onTake={setReading} />
        </div>
      </div>
      <MoreFields gliderId={gliderId} more={more} onMore={setMore} />
      <p role="status" className="mt-2 min-h-6">
        {said}
      </p>
    </form>
  );
}
