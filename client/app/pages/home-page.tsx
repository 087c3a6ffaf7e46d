import { useMemo, useState } from 'react';
import { Link, Navigate, useNavigate } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { buttonClass } from '#client/components/ui/button.tsx';
import { BeamView } from '#client/features/balance/beam-view.tsx';
import { SampleGlance } from '#client/features/gliders/sample-glance.tsx';
import { samplePlan } from '#client/features/gliders/sample-plan.ts';
import { useKeeper, useWorkspace } from '#client/features/gliders/workspace-context.ts';
import { SampleWorkspaceProvider } from '#client/features/gliders/workspace.tsx';
import { useSession } from '#client/features/session/queries.ts';
import { useTitle } from '#client/hooks/use-title.ts';
import { useValidPlan } from '#client/hooks/use-valid-plan.ts';
import { useUnits } from '#client/lib/units.ts';
import { beamOf } from '#shared/core/beam.ts';
import { wingReference } from '#shared/core/wing-reference.ts';
import { formatNumber, NARROW_SPACE } from '#shared/format/numbers.ts';
import { convert } from '#shared/units/units.ts';
import { SheetPaper } from '../sheet-paper.tsx';

/** For the visitor; who is signed in goes straight to the bench. */
export function HomePage() {
  const session = useSession();
  useTitle('');
  if (session.isPending) return null;
  if (session.data?.user) return <Navigate to={paths.bench} replace />;
  return (
    <SheetPaper>
      <SampleWorkspaceProvider original={samplePlan}>
        <Glance />
      </SampleWorkspaceProvider>
    </SheetPaper>
  );
}

function Glance() {
  const workspace = useWorkspace();
  const plan = useValidPlan(workspace) ?? samplePlan;
  const keeper = useKeeper();
  const units = useUnits();
  const wing = workspace.result.planform['wing'];
  return (
    <SampleGlance
      workspace={workspace}
      plan={plan}
      onStartAgain={keeper.kind === 'sample' ? keeper.sample.startAgain : undefined}
      beam={<SampleBeam plan={plan} />}
    >
      <h1 className="text-[1.75rem] leading-9 font-semibold">
        Know what a glider will weigh and where it will balance, before a stick is cut.
      </h1>
      <p className="mt-3">
        Draw the wing, pick the wood you have: each part gets its mass, the model its balance point and its
        wing loading, while you type. Here is a sample to try, {plan.name}
        {wing &&
          `, ${formatNumber(convert(wing.span, 'mm', units.long), 1)}${NARROW_SPACE}${units.long} across`}
        .
      </p>
      <p className="mt-5 flex flex-wrap gap-2 sm:gap-3">
        <Link to={paths.sample()} className={buttonClass('primary')}>
          Open the sample
        </Link>
        <Link to={paths.signUp()} className={buttonClass('quiet')}>
          Sign up
        </Link>
        <Link to={paths.signIn()} className={buttonClass('plain')}>
          Sign in
        </Link>
      </p>
    </SampleGlance>
  );
}

function SampleBeam({ plan }: { plan: typeof samplePlan }) {
  const { result } = useWorkspace();
  const navigate = useNavigate();
  const [lit, setLit] = useState<string | null>(null);
  const beam = useMemo(() => beamOf(result, wingReference(plan), plan.target), [result, plan]);
  if (!beam) return null;
  return (
    <BeamView
      beam={beam}
      plan={plan}
      lines={result.lines}
      lit={lit}
      onLight={setLit}
      picked={null}
      onOpen={() => void navigate(paths.sample('balance'))}
      outside={result.notices.some(({ code }) => code === 'balance_outside_target')}
    />
  );
}
