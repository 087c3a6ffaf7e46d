import { useEffect, useState, useSyncExternalStore } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Notice } from '#client/components/ui/notice.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import { formatMoment } from '#client/lib/moments.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import type { Autosaver } from './autosaver.ts';
import { ConflictBanner } from './conflict-banner.tsx';
import { useCreateGlider } from './mutations.ts';
import { useWish } from './use-wish.ts';

interface DeskNoticesProps {
  workspace: Workspace;
  saver: Autosaver;
  /** Opens a glider that was made from this one. */
  onOpen: (gliderId: string) => void;
  /** Leads to signing in and back here. */
  onSignIn: () => void;
}

/** What stands between the plan on the desk and the one that is stored. */
export function DeskNotices({ workspace, saver, onOpen, onSignIn }: DeskNoticesProps) {
  const desk = useSyncExternalStore(saver.subscribe, saver.getDesk);
  const create = useCreateGlider();
  const wish = useWish();
  const say = useToast();
  const [seen, setSeen] = useState(false);

  const keepAsNew = () => {
    const { check, theirs, history } = saver.getDesk();
    if (!check.ok) return say('First mend what is not valid.');
    const plan = { ...check.plan, name: `${history.present.name} (mine)`.slice(0, 120) };
    create.mutate(
      { plan, wish: wish.current() },
      {
        onSuccess: (glider) => {
          wish.granted();
          if (theirs) saver.dispatch({ type: 'tookTheirs', at: Date.now() });
          else saver.forget();
          onOpen(glider.id);
        },
        onError: (error) => say(error.message),
      },
    );
  };

  if (desk.phase === 'conflict' && desk.theirs) {
    return (
      <ConflictBanner
        theirs={desk.theirs}
        mine={workspace.result}
        onKeepMine={() => saver.dispatch({ type: 'keptMine' })}
        onTakeTheirs={() => saver.dispatch({ type: 'tookTheirs', at: Date.now() })}
        onKeepAsNew={keepAsNew}
        pending={create.isPending}
      />
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
              <Button onClick={keepAsNew} pending={create.isPending}>
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
  if (restored !== null && !seen) {
    const drop = () => {
      setSeen(true);
      workspace.edit(() => restored.over, 'drop restored edits');
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
  return null;
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
