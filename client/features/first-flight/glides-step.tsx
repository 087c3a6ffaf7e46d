import { Button } from '#client/components/ui/button.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { FlightDraft } from './draft.ts';
import { GLIDES, type Behaviour } from './glide-advice.ts';
import { Step } from './step.tsx';
import type { ChangeDraft } from './use-draft.ts';

const BEHAVIOURS = Object.keys(GLIDES) as Behaviour[];

/** Each hand glide, how it went, and what is usually changed after it. */
export function GlidesStep({ draft, change }: { draft: FlightDraft; change: ChangeDraft }) {
  const { glides } = draft;
  return (
    <Step title="Test glides" state={glides.length === 0 ? '' : String(glides.length)}>
      <p className="mt-1 text-note text-graphite">
        Into the wind, level, from the shoulder, over long grass. Press how it went; change one thing at a
        time. What is advised is common practice; the glide decides.
      </p>
      <ol className="mt-2">
        {glides.map(({ behaviour, note }, i) => (
          <li key={i} className="border-b border-rule py-2">
            <p className="flex items-center justify-between gap-2">
              <strong className="font-semibold">
                {i + 1}. {GLIDES[behaviour].label}
              </strong>
              <Button
                variant="plain"
                className="min-h-11"
                onClick={() => change({ glides: glides.filter((_, k) => k !== i) })}
              >
                Strike<span className="sr-only"> glide {i + 1}</span>
              </Button>
            </p>
            {i === glides.length - 1 && <p className="mb-1">{GLIDES[behaviour].advice}</p>}
            <TextField
              label={
                <>
                  Changed after it<span className="sr-only"> {i + 1}</span>
                </>
              }
              keepRoom={false}
              value={note}
              maxLength={LIMITS.note.max}
              onChange={({ currentTarget }) =>
                change({
                  glides: glides.map((one, k) => (k === i ? { ...one, note: currentTarget.value } : one)),
                })
              }
            />
          </li>
        ))}
      </ol>
      <div role="group" aria-label="It" className="mt-3 grid grid-cols-2 gap-2">
        {BEHAVIOURS.map((behaviour) => (
          <Button
            key={behaviour}
            className="min-h-12"
            disabled={glides.length >= LIMITS.glides.max}
            onClick={() => change({ glides: [...glides, { behaviour, note: '' }] })}
          >
            {GLIDES[behaviour].label}
          </Button>
        ))}
      </div>
    </Step>
  );
}
