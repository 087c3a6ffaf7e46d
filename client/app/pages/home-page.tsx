import { Link, Navigate } from 'react-router-dom';
import { paths } from '#client/app/paths.ts';
import { buttonClass } from '#client/components/ui/button.tsx';
import { SampleGlance } from '#client/features/gliders/sample-glance.tsx';
import { samplePlan } from '#client/features/gliders/sample-plan.ts';
import { useWorkspace } from '#client/features/gliders/workspace-context.ts';
import { SampleWorkspaceProvider } from '#client/features/gliders/workspace.tsx';
import { useSession } from '#client/features/session/queries.ts';
import { useTitle } from '#client/hooks/use-title.ts';
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
  return (
    <SampleGlance workspace={workspace}>
      <h1 className="text-[1.75rem] leading-9 font-semibold">
        Know what a glider will weigh and where it will balance, before a stick is cut.
      </h1>
      <p className="mt-3">
        Draw the wing, pick the wood you have: each part gets its mass, the model its balance point and its
        wing loading, while you type. Here is {workspace.plan.name}, a towline glider of 1.2 m, to try.
      </p>
      <p className="mt-5 flex flex-wrap gap-3">
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
