import { useCallback, useEffect, useRef, useState } from 'react';
import { changeSentence, changesInWords } from '#client/lib/change-words.ts';
import { useUnits } from '#client/lib/units.ts';
import type { Workspace } from '#client/lib/workspace.ts';
import { planChanges } from '#shared/core/plan-changes.ts';
import type { Plan } from '#shared/core/plan.ts';

export interface Undo {
  undo: () => void;
  redo: () => void;
  /** what the last press came to, for whoever does not see it */
  said: string;
}

/** Undo and redo that say what they did. */
export function useUndo({ plan, undo, redo }: Pick<Workspace, 'plan' | 'undo' | 'redo'>): Undo {
  const units = useUnits();
  const pressed = useRef<{ word: string; plan: Plan } | null>(null);
  const [said, setSaid] = useState('');
  useEffect(() => {
    const press = pressed.current;
    if (press === null || press.plan === plan) return;
    pressed.current = null;
    const words = changesInWords(
      planChanges(press.plan, plan),
      { ...press.plan.materials, ...plan.materials },
      units,
    );
    setSaid(`${press.word}: ${changeSentence(words)}`);
  }, [plan, units]);
  const act = useCallback(
    (word: string, action: () => void) => () => {
      pressed.current = { word, plan };
      action();
    },
    [plan],
  );
  return { undo: act('Undone', undo), redo: act('Redone', redo), said };
}

/**
 * Undo and redo by keyboard. A field whose text has changed nothing in the plan, such as a search or a note, undoes
 * its own text; in all others one undo goes through the whole plan, whichever field the cursor is in.
 */
export function useUndoKeys(plan: Plan, undo: () => void, redo: () => void): void {
  const now = useRef(plan);
  /** the field typed in last, and the plan before that letter */
  const typed = useRef<{ field: EventTarget | null; plan: Plan } | null>(null);
  useEffect(() => {
    now.current = plan;
  }, [plan]);
  useEffect(() => {
    const onInput = ({ target }: Event) => {
      typed.current = { field: target, plan: now.current };
    };
    const onKeyDown = (event: KeyboardEvent) => {
      if (!(event.ctrlKey || event.metaKey) || event.altKey) return;
      const key = event.key.toLowerCase();
      if ((key !== 'z' && key !== 'y') || inDialog(event.target)) return;
      const ownText = typed.current?.field === event.target && typed.current?.plan === now.current;
      if (ownText) return;
      event.preventDefault();
      typed.current = null;
      if (key === 'y' || event.shiftKey) redo();
      else undo();
    };
    addEventListener('input', onInput, { capture: true });
    addEventListener('keydown', onKeyDown);
    return () => {
      removeEventListener('input', onInput, { capture: true });
      removeEventListener('keydown', onKeyDown);
    };
  }, [undo, redo]);
}

/** What is undone must be in sight. */
const inDialog = (target: EventTarget | null) =>
  target instanceof Element && target.closest('[role=dialog]') !== null;
