import { Notice } from '#client/components/ui/notice.tsx';
import { useKept } from '#client/hooks/use-kept.ts';
import { useValidPlan } from '#client/hooks/use-valid-plan.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import type { Plan } from '#shared/core/plan.ts';
import { trialsInput, type TrialsInput } from '#shared/schemas/trials.ts';
import { KeptTrials } from './kept-trials.tsx';
import { TrialSheet } from './trial-sheet.tsx';

/** Woods side by side at equal terms. */
export function TrialPlace({ workspace }: { workspace: Workspace }) {
  const plan = useValidPlan(workspace);
  if (!plan) {
    return (
      <div className="px-4 py-6 sm:px-7">
        <Notice tone="red" word="Not yet">
          The drawing has to be mended before wood can be tried:{' '}
          {workspace.problem ?? 'a field holds no usable number.'}
        </Notice>
      </div>
    );
  }
  const { glider } = workspace;
  return glider ? (
    <KeptTrials key={glider.id} workspace={workspace} plan={plan} glider={glider.id} />
  ) : (
    <SampleTrials workspace={workspace} plan={plan} />
  );
}

const NONE: TrialsInput = { trials: [], terms: { arm: null, minimumMass: null } };
const sampleSchema = trialsInput.nullable();

/** The sample's trials stay on this device. */
function SampleTrials({ workspace, plan }: { workspace: Workspace; plan: Plan }) {
  const [list, keep] = useKept('featherbeam.trials.sample', sampleSchema, null);
  return (
    <TrialSheet
      workspace={workspace}
      plan={plan}
      list={list ?? NONE}
      untouched={list === null}
      onList={keep}
      status={<p className="text-note text-graphite">Trials of the sample are kept on this device.</p>}
    />
  );
}
