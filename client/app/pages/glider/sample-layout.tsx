import { useNavigate } from 'react-router-dom';
import { useCrumbs } from '#client/app/crumbs.tsx';
import { paths, SAMPLE_PLACES, type Place } from '#client/app/paths.ts';
import { samplePlan } from '#client/features/gliders/sample-plan.ts';
import { InvalidNotice } from '#client/features/gliders/desk-notices.tsx';
import { SampleNotice } from '#client/features/gliders/sample-notice.tsx';
import { useKeeper, useWorkspace } from '#client/features/gliders/workspace-context.ts';
import { SampleWorkspaceProvider } from '#client/features/gliders/workspace.tsx';
import { useUser } from '#client/features/session/queries.ts';
import { useTitle } from '#client/hooks/use-title.ts';
import { GliderFrame } from './glider-frame.tsx';

export function SampleLayout() {
  return (
    <SampleWorkspaceProvider original={samplePlan}>
      <Desk />
    </SampleWorkspaceProvider>
  );
}

const isSamplePlace = (place: Place): place is (typeof SAMPLE_PLACES)[number] =>
  SAMPLE_PLACES.some((one) => one === place);
const hrefOf = (place: Place) => paths.sample(isSamplePlace(place) ? place : undefined);

function Desk() {
  const workspace = useWorkspace();
  const keeper = useKeeper();
  const user = useUser();
  const navigate = useNavigate();
  const home = user ? { label: 'Bench', href: paths.bench } : { label: 'Sample', href: paths.home };
  useTitle(`${workspace.plan.name}, sample`);
  useCrumbs([home, { label: workspace.plan.name }]);
  return (
    <GliderFrame
      places={SAMPLE_PLACES}
      hrefOf={hrefOf}
      notices={workspace.saveState === 'invalid' && <InvalidNotice problem={workspace.problem} />}
      aside={
        keeper.kind === 'sample' && (
          <SampleNotice
            workspace={workspace}
            sample={keeper.sample}
            signedIn={Boolean(user)}
            signUpHref={paths.signUp(paths.sample())}
            onOpen={(id) => void navigate(paths.glider(id))}
          />
        )
      }
    />
  );
}
