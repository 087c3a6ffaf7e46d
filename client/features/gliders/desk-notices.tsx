import { useEffect, useState, useSyncExternalStore } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { formatMoment } from '#client/lib/moments.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import type { Autosaver } from './autosaver.ts';
import { ConflictBanner } from './conflict-banner.tsx';
import { ConflictDialog } from './conflict-dialog.tsx';
import { DeskNews } from './desk-news.tsx';
import { rebased } from './desk-merge.ts';
import type { Desk } from './desk-state.ts';
import { useKeepAsNew } from './use-keep-as-new.ts';

interface DeskNoticesProps {
  workspace: Workspace;
  saver: Autosaver;
  userName: string;
  /** Opens a glider that was made from this one. */
  onOpen: (gliderId: string) => void;
  /** Leads to signing in and back here. */
  onSignIn: () => void;
}

/** What stands between the plan on the desk and the one that is stored, and what came in from there. */
export function DeskNotices(props: DeskNoticesProps) {
  const { workspace, saver, userName } = props;
  const desk = useSyncExternalStore(saver.subscribe, saver.getDesk);
  return (
    <>
      <MainNotice {...props} desk={desk} />
      {desk.news && (
        <DeskNews
          news={desk.news}
          materials={workspace.plan.materials}
          userName={userName}
          onRead={() => saver.dispatch({ type: 'newsRead' })}
        />
      )}
    </>
  );
}

function MainNotice({
  workspace,
  saver,
  userName,
  onOpen,
  onSignIn,
  desk,
}: DeskNoticesProps & { desk: Desk }) {
  const { keep, pending } = useKeepAsNew(saver, onOpen);
  /** version of the other state whose question was put off */
  const [later, setLater] = useState<number | null>(null);
  const [seen, setSeen] = useState(false);
  const { theirs } = desk;

  if (theirs) {
    return (
      <>
        <ConflictBanner
          theirs={theirs}
          userName={userName}
          count={desk.conflicts.length}
          onOpen={() => setLater(null)}
        />
        <ConflictDialog
          open={later !== theirs.version}
          onOpenChange={(open) => setLater(open ? null : theirs.version)}
          desk={desk}
          theirs={theirs}
          userName={userName}
          onDecide={(choices) => saver.dispatch({ type: 'decided', choices, at: Date.now() })}
          onKeepAsNew={keep}
          pending={pending}
        />
      </>
    );
  }
  const troubled = desk.phase === 'refused' || (desk.phase === 'waiting' && !desk.offline);
  if (troubled && desk.problem !== null) {
    return (
      <Notice
        tone="ochre"
        live
        word={desk.phase === 'waiting' ? 'Not saved yet; it is tried again by itself.' : 'Not saved.'}
        className="mb-3"
        actions={
          <>
            {desk.signedOut ? (
              <Button variant="primary" onClick={onSignIn}>
                Sign in
              </Button>
            ) : (
              <Button onClick={saver.retry}>Try again</Button>
            )}
            {!desk.signedOut && (
              <Button onClick={keep} pending={pending}>
                Keep as a new glider
              </Button>
            )}
          </>
        }
      >
        {desk.problem}
      </Notice>
    );
  }
  if (workspace.saveState === 'invalid') return <InvalidNotice problem={workspace.problem} />;
  const { restored } = desk;
  if (restored === null || seen) return null;
  const drop = () => {
    setSeen(true);
    workspace.edit((plan) => rebased(restored.plan, restored.over, plan), 'drop restored edits');
  };
  return (
    <Notice
      tone="ink"
      className="mb-3"
      actions={
        <>
          <Button onClick={drop}>Drop them</Button>
          <Button onClick={() => setSeen(true)}>Keep them</Button>
        </>
      }
    >
      Edits of {formatMoment(restored.at)} that had not reached the server were put back.
    </Notice>
  );
}

/** Said after a moment, so that a field half typed is not scolded. */
export function InvalidNotice({ problem }: { problem: string | undefined }) {
  const [late, setLate] = useState(false);
  useEffect(() => {
    const timer = setTimeout(() => setLate(true), 900);
    return () => clearTimeout(timer);
  }, []);
  if (!late || problem === undefined) return null;
  return (
    <Notice tone="ochre" live word="Not saved." className="mb-3">
      {problem} The figures are those of the last valid plan; your edits are kept on this device.
    </Notice>
  );
}
