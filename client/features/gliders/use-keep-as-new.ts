import { useToast } from '#client/components/ui/toast.tsx';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { Autosaver } from './autosaver.ts';
import { useCreateGlider } from './mutations.ts';
import { useWish } from './use-wish.ts';

const ENDING = ' (mine)';

/** Makes a glider of its own from the plan on the desk, and gives the edits up here. */
export function useKeepAsNew(
  saver: Autosaver,
  onOpen: (gliderId: string) => void,
): { keep: () => void; pending: boolean } {
  const create = useCreateGlider();
  const wish = useWish();
  const say = useToast();
  const keep = () => {
    const { check, theirs, history } = saver.getDesk();
    if (!check.ok) return say('First mend what is not valid.');
    const name = history.present.name.slice(0, LIMITS.name.max - ENDING.length) + ENDING;
    create.mutate(
      { plan: { ...check.plan, name }, wish: wish.current() },
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
  return { keep, pending: create.isPending };
}
