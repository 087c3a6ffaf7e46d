import { Button } from '#client/components/ui/button.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { FlightDraft } from './draft.ts';
import type { ChangeDraft } from './use-draft.ts';

/** What was put in since the weighing; it can be taken out again, or weighed with the model. */
export function FittedList({ draft, change }: { draft: FlightDraft; change: ChangeDraft }) {
  const units = useUnits();
  const { ballast, supports, note } = draft;
  if (ballast.length === 0) return null;
  const placed = ballast.map(
    ({ name, mass, x }) => `${name}, ${units.format(mass, 'mass')} at ${units.format(x, 'length')}`,
  );
  const weighAgain = () =>
    change({
      // Now it stands on the scales with the rest, and is not counted twice.
      ballast: [],
      supports: supports.map((one) => ({ ...one, reading: null })),
      finger: { mass: null, tipsForwardAt: null, tipsAftAt: null },
      note: [note, `Weighed again with ballast aboard: ${placed.join('; ')}.`]
        .filter(Boolean)
        .join(' ')
        .slice(0, 2000),
    });
  return (
    <section aria-label="Fitted" className="mt-4">
      <h3 className="font-semibold">Fitted since the weighing</h3>
      <ul>
        {placed.map((words, i) => (
          <li key={i} className="flex items-center justify-between gap-2 border-b border-rule">
            {words}
            <Button
              variant="plain"
              className="min-h-11"
              onClick={() => change({ ballast: ballast.filter((_, k) => k !== i) })}
            >
              Take out<span className="sr-only"> {ballast[i]?.name}</span>
            </Button>
          </li>
        ))}
      </ul>
      <Button className="mt-2 min-h-12 w-full sm:w-auto" onClick={weighAgain}>
        Weigh again with it aboard
      </Button>
    </section>
  );
}
