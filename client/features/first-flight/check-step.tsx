import { useState } from 'react';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { cn } from '#client/lib/cn.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { checkState, type CheckLine } from './checks.ts';
import type { CheckAnswer, FlightDraft } from './draft.ts';
import { Step } from './step.tsx';
import type { ChangeDraft } from './use-draft.ts';

interface CheckStepProps {
  draft: FlightDraft;
  change: ChangeDraft;
  lines: readonly CheckLine[];
}

const NO_ANSWER: CheckAnswer = { answer: null, note: '' };

/** What is gone through before the model leaves the hand, the rules and the people first. */
export function CheckStep({ draft, change, lines }: CheckStepProps) {
  const { answered, against } = checkState(lines, draft.checks);
  const put = (id: string, changes: Partial<CheckAnswer>) =>
    change({ checks: { ...draft.checks, [id]: { ...(draft.checks[id] ?? NO_ANSWER), ...changes } } });
  return (
    <Step title="Before you let go" state={`${answered} of ${lines.length}`}>
      <div className="mt-2 grid grid-cols-2 gap-x-4">
        <TextField
          label="Field"
          value={draft.place}
          maxLength={LIMITS.name.max}
          onChange={({ currentTarget }) => change({ place: currentTarget.value })}
        />
        <NumberField
          label="Wind measured"
          quantity="speed"
          value={draft.wind}
          min={0}
          max={60}
          optional
          onChange={(wind) => change({ wind })}
        />
      </div>
      <ol>
        {lines.map((line) => (
          <CheckRow
            key={line.id}
            line={line}
            value={draft.checks[line.id] ?? NO_ANSWER}
            onChange={(changes) => put(line.id, changes)}
          />
        ))}
      </ol>
      {against.length > 0 && (
        <p role="status" className="mt-2 font-semibold text-red">
          <span aria-hidden="true">▲ </span>
          {against.length === 1 ? 'One thing is' : `${against.length} things are`} not right: mend before you
          fly.
        </p>
      )}
    </Step>
  );
}

interface CheckRowProps {
  line: CheckLine;
  value: CheckAnswer;
  onChange: (changes: Partial<CheckAnswer>) => void;
}

function CheckRow({ line, value, onChange }: CheckRowProps) {
  const [noting, setNoting] = useState(value.note !== '');
  const answers = [
    { key: 'yes', label: 'Yes' },
    { key: 'no', label: 'No' },
    ...(line.mayLack ? ([{ key: 'not_on_this_model', label: 'Has none' }] as const) : []),
  ] as const;
  const wantsNote = noting || value.answer === 'no';
  return (
    <li className="border-b border-rule py-3">
      <fieldset>
        <legend>
          {line.words}
          {line.hint && <span className="mt-0.5 block text-note text-graphite">{line.hint}</span>}
        </legend>
        <div className="mt-2 flex flex-wrap items-center gap-2">
          {answers.map(({ key, label }) => (
            <label
              key={key}
              className={cn(
                'flex min-h-11 min-w-16 items-center justify-center gap-1.5 rounded-md border px-3 font-semibold',
                'has-focus-visible:outline-2 has-focus-visible:outline-offset-2 has-focus-visible:outline-ink',
                value.answer !== key && 'border-ink text-ink',
                value.answer === key &&
                  (key === 'no' ? 'border-red bg-red-wash text-red' : 'border-ink bg-ink text-on-ink'),
              )}
            >
              <input
                type="radio"
                name={`check-${line.id}`}
                className="sr-only"
                checked={value.answer === key}
                onChange={() => onChange({ answer: key })}
              />
              {value.answer === key && <span aria-hidden="true">{key === 'no' ? '▲' : '✓'}</span>}
              {label}
            </label>
          ))}
          {!wantsNote && (
            <button
              type="button"
              className="min-h-11 px-2 text-note text-ink underline"
              onClick={() => setNoting(true)}
            >
              Note<span className="sr-only">: {line.words}</span>
            </button>
          )}
        </div>
        {wantsNote && (
          <div className="mt-2">
            <TextField
              label="Note"
              keepRoom={false}
              value={value.note}
              maxLength={LIMITS.note.max}
              onChange={({ currentTarget }) => onChange({ note: currentTarget.value })}
            />
          </div>
        )}
      </fieldset>
    </li>
  );
}
