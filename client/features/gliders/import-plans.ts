import { useRef, useState } from 'react';
import type { Plan } from '#shared/core/plan.ts';
import type { GliderDto } from '#shared/schemas/glider.ts';
import { useCreateGlider } from './mutations.ts';

/** Lays plans on the bench one after the other. What came in before one was refused is not sent again. */
export function useImport() {
  const { mutateAsync } = useCreateGlider();
  const [pending, setPending] = useState(false);
  const [error, setError] = useState<Error | null>(null);
  const [done, setDone] = useState(0);
  const made = useRef<GliderDto[]>([]);
  const wishes = useRef<string[]>([]);

  const reset = () => {
    made.current = [];
    wishes.current = [];
    setError(null);
    setDone(0);
  };
  /** The gliders, or null where one was refused. */
  const bring = async (plans: readonly Plan[]): Promise<readonly GliderDto[] | null> => {
    setPending(true);
    setError(null);
    try {
      for (const [i, plan] of plans.entries()) {
        if (made.current[i]) continue;
        const wish = (wishes.current[i] ??= crypto.randomUUID());
        made.current[i] = await mutateAsync({ plan, wish });
        setDone(i + 1);
      }
      return made.current;
    } catch (refused) {
      setError(refused instanceof Error ? refused : new Error('Importing did not work.'));
      return null;
    } finally {
      setPending(false);
    }
  };
  return { bring, pending, error, done, reset };
}
