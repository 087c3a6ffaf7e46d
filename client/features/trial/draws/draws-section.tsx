import { lazy, Suspense, useMemo, useState } from 'react';
import { SectionBoundary } from '#client/components/section-boundary.tsx';
import { Select } from '#client/components/ui/select.tsx';
import { Skeleton } from '#client/components/ui/skeleton.tsx';
import { WhenNear } from '#client/components/when-near.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Plan } from '#shared/core/plan.ts';
import { DrawsFields } from './draws-fields.tsx';
import { DrawsState } from './draws-state.tsx';
import { DrawsTable } from './draws-table.tsx';
import type { DrawSettings } from './settings.ts';
import type { FiguresTask } from './tasks.ts';
import { useDrawing } from './use-drawing.ts';
import { agreementSentence, drawsHeadline, targetSentence } from './words.ts';

const DrawsCharts = lazy(async () => ({ default: (await import('./draws-charts.tsx')).DrawsCharts }));

interface DrawsSectionProps {
  /** what can be drawn, by its name: the plan as drawn first, then say trials */
  models: readonly { name: string; plan: Plan }[];
  settings: DrawSettings;
  onSettings: (settings: DrawSettings) => void;
}

/** What the model may weigh and where it may balance, by drawing the masses of its parts again and again. */
export function DrawsSection({ models, settings, onSettings }: DrawsSectionProps) {
  const [chosen, choose] = useState(0);
  const model = models[chosen] ?? models[0];
  const plan = model?.plan;
  const task = useMemo(
    (): FiguresTask | null => (plan ? { of: 'figures', plan, settings } : null),
    [plan, settings],
  );
  const drawing = useDrawing(task);
  const units = useUnits();
  if (!model || !plan) return null;
  const { answer } = drawing;

  return (
    <section aria-labelledby="draws" className="mt-10 border-t border-rule pt-6">
      <h2 id="draws" className="text-heading font-semibold">
        {answer ? drawsHeadline(answer, units) : 'What it may weigh and where it may balance'}
      </h2>
      <p className="mt-1 max-w-3xl text-graphite">
        {answer && targetSentence(answer, plan)} Each draw gives every part a density and a thickness of its
        own by chance, within what is known of them.
      </p>
      <div className="mt-5 grid grid-cols-1 items-start gap-x-12 gap-y-6 lg:grid-cols-[minmax(0,3fr)_minmax(0,2fr)]">
        <div className="min-h-52">
          {answer?.mass && (
            <>
              <DrawsTable figures={answer} />
              <p className="mt-3 max-w-prose text-note text-graphite">{agreementSentence(answer, units)}</p>
            </>
          )}
          <DrawsState drawing={drawing} draws={settings.draws} />
        </div>
        <div className="max-w-lg">
          {models.length > 1 && (
            <Select
              label="Model drawn"
              value={String(models.indexOf(model))}
              options={models.map(({ name }, i) => ({ value: String(i), label: name }))}
              onValue={(value) => choose(Number(value))}
            />
          )}
          <DrawsFields plan={plan} settings={settings} onSettings={onSettings} />
        </div>
      </div>
      {answer?.mass && (
        <div className="mt-8">
          <SectionBoundary>
            <WhenNear before={<Skeleton lines={6} />}>
              <Suspense fallback={<Skeleton lines={6} />}>
                <DrawsCharts plan={plan} figures={answer} />
              </Suspense>
            </WhenNear>
          </SectionBoundary>
        </div>
      )}
    </section>
  );
}
