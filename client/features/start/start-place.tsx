import { useDeferredValue, useMemo, type ReactNode } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { useKept } from '#client/hooks/use-kept.ts';
import type { TableMaterial } from '#client/lib/material-snapshot.ts';
import type { Plan } from '#shared/core/plan.ts';
import { guidedPlan } from '#shared/plan-start/guided-start.ts';
import { guidedProblems } from '#shared/plan-start/guided-wishes.ts';
import { GuidedForm } from './guided-form.tsx';
import { GuidedPreview } from './guided-preview.tsx';
import { completed, FIRST_WISHES, keptWishes } from './wishes.ts';

interface StartPlaceProps {
  /** whose wishes are kept in this browser */
  person: string;
  table: readonly TableMaterial[];
  /** a glider is being made */
  pending: boolean;
  onDraw: (plan: Plan) => void;
  /** the other ways to begin */
  others: ReactNode;
}

/** A few wishes, and what they come to while they are typed. */
export function StartPlace({ person, table, pending, onDraw, others }: StartPlaceProps) {
  const [kept, keep] = useKept(`featherbeam-start-${person}`, keptWishes, FIRST_WISHES);
  const wishes = completed(kept);
  const problems = guidedProblems(wishes);
  const shown = useDeferredValue(kept);
  const plan = useMemo(() => {
    const asked = completed(shown);
    return guidedProblems(asked).length === 0 ? guidedPlan(asked, table) : null;
  }, [shown, table]);
  const draw = () => {
    if (problems.length > 0 || table.length === 0) return;
    onDraw(guidedPlan(wishes, table));
    keep({ ...kept, name: '' });
  };
  return (
    <>
      <header>
        <h1 className="text-figure font-semibold">New glider</h1>
        <p className="mt-1 max-w-2xl text-graphite">
          Say what it is to be; it is drawn with sensible sizes and wood, and every part of it can be altered
          afterwards.
        </p>
      </header>
      <div className="mt-6 grid gap-x-10 gap-y-8 lg:grid-cols-[minmax(20rem,26rem)_minmax(0,1fr)] lg:grid-rows-[auto_1fr]">
        <form
          onSubmit={(event) => {
            event.preventDefault();
            draw();
          }}
        >
          <GuidedForm wishes={kept} problems={problems} onWishes={keep} />
          <Button
            type="submit"
            variant="primary"
            className="mt-4"
            pending={pending}
            pendingText="Drawing …"
            disabled={problems.length > 0 || table.length === 0}
          >
            Draw it
          </Button>
        </form>
        <div className="min-w-0 lg:row-span-2">
          <GuidedPreview plan={plan} />
        </div>
        <div className="border-t border-rule pt-4">
          <h2 className="caption">Or begin otherwise</h2>
          <div className="mt-2 flex flex-wrap gap-2">{others}</div>
        </div>
      </div>
    </>
  );
}
