import type { ReactNode } from 'react';
import { Amount } from '#client/components/ui/amount.tsx';
import { Button } from '#client/components/ui/button.tsx';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { Select } from '#client/components/ui/select.tsx';
import { useUnits } from '#client/lib/units.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import type { Item, Part, Plan } from '#shared/core/plan.ts';
import type { Units } from '#shared/format/units.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { PlanPicture } from '#client/components/drawing/plan-picture.tsx';
import { balanceVerdict } from './verdict.ts';

interface SampleGlanceProps {
  workspace: Workspace;
  /** The plan that the figures are of. */
  plan: Plan;
  onStartAgain: (() => void) | undefined;
  /** The beam, drawn under the plan. */
  beam: ReactNode;
  /** What stands over the figures. */
  children: ReactNode;
}

/** The sample at a glance, with one weight and one wood to try: every change shows at once. */
export function SampleGlance({ workspace, plan, onStartAgain, beam, children }: SampleGlanceProps) {
  const { result, edit, canUndo } = workspace;
  const ballast = workspace.plan.items.find(({ group }) => group === 'ballast');
  const sheeting = workspace.plan.surfaces.flatMap(({ parts }) => parts).find(({ kind }) => kind === 'skin');
  const units = useUnits();
  const verdict = balanceVerdict(plan, result, units);
  return (
    <div className="grid items-start gap-x-12 gap-y-6 lg:grid-cols-[minmax(20rem,26rem)_1fr]">
      <div>
        {children}
        <dl className="mt-6 grid grid-cols-2 border-t border-strong-rule">
          <Figure label="Mass">
            <Amount value={result.totals.mass} u={result.totals.u} quantity="mass" flash />
          </Figure>
          <Figure label="Balance">
            <Amount value={result.balance.percentMac} quantity="percentMac" of="MAC" flash />
          </Figure>
          <Figure label="Wing loading">
            <Amount value={result.loading.wing} quantity="loading" flash />
          </Figure>
          <Figure label="Static margin">
            <Amount value={result.balance.staticMargin} quantity="fineShare" flash />
          </Figure>
        </dl>
        <div className="min-h-6">{verdict && <VerdictLine {...verdict} />}</div>
        <div className="mt-5 grid max-w-sm gap-x-2">
          <div className="mb-2 flex min-h-row items-center justify-between">
            <p className="caption">Try it</p>
            {canUndo && onStartAgain && (
              <Button variant="plain" className="text-note" onClick={onStartAgain}>
                Start again
              </Button>
            )}
          </div>
          {ballast && (
            <NumberField
              inline
              label={ballast.name}
              quantity="mass"
              value={ballast.mass}
              min={0}
              max={LIMITS.massG.max}
              keepRoom
              onChange={(mass) => {
                if (mass !== null) edit((p) => withItem(p, { ...ballast, mass }), 'nose weight');
              }}
            />
          )}
          {sheeting && (
            <Select
              inline
              label={`${sheeting.name}, wood`}
              value={sheeting.material}
              options={woodsOf(plan)}
              suffix={densityText(plan, sheeting.material, units)}
              onValue={(material) => edit((p) => withMaterial(p, sheeting.id, material), 'sheeting wood')}
            />
          )}
        </div>
      </div>
      <div className="mx-auto w-full max-w-3xl">
        <PlanPicture
          plan={plan}
          balance={result.balance.x}
          label={`${plan.name} from above, with its balance point.`}
        />
        <div className="mt-6">{beam}</div>
      </div>
    </div>
  );
}

function Figure({ label, children }: { label: string; children: ReactNode }) {
  return (
    <div className="border-b border-rule py-2 pr-3">
      <dt className="text-label text-graphite">{label}</dt>
      <dd className="text-figure font-semibold">{children}</dd>
    </div>
  );
}

function VerdictLine({ kind, text }: { kind: 'inside' | 'close' | 'outside'; text: string }) {
  if (kind === 'inside')
    return <p className="mt-2 text-note text-graphite">It balances where it should: {text} % MAC.</p>;
  return (
    <p className={`mt-2 text-note ${kind === 'outside' ? 'text-red' : 'text-ochre'}`}>
      <span aria-hidden="true">{kind === 'outside' ? '▲ ' : '◆ '}</span>
      {kind === 'outside' ? 'Out of balance: ' : 'Too close to be sure: '}
      {text}
    </p>
  );
}

function woodsOf({ materials }: Plan) {
  return Object.entries(materials)
    .filter(([, { category, density }]) => category === 'wood' && density !== undefined)
    .map(([value, { name }]) => ({ value, label: name }));
}

function densityText({ materials }: Plan, key: string, units: Units): string | undefined {
  const density = materials[key]?.density;
  return density === undefined ? undefined : units.format(density, 'density');
}

function withItem(plan: Plan, item: Item): Plan {
  return { ...plan, items: plan.items.map((other) => (other.id === item.id ? item : other)) };
}

function withMaterial(plan: Plan, partId: string, material: string): Plan {
  const swap = (part: Part): Part =>
    part.id === partId && part.kind === 'skin' ? { ...part, material } : part;
  return {
    ...plan,
    surfaces: plan.surfaces.map((surface) => ({ ...surface, parts: surface.parts.map(swap) })),
  };
}
