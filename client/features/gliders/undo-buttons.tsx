import { useEffect } from 'react';
import { cn } from '#client/lib/cn.ts';
import type { Workspace } from '#client/lib/workspace.ts';

const BUTTON =
  'grid size-row place-items-center rounded-md text-ink enabled:hover:bg-ink-wash disabled:text-graphite disabled:opacity-50';

/** Undo and redo by keyboard, where no field has its own. */
export function useUndoKeys({ undo, redo }: Pick<Workspace, 'undo' | 'redo'>): void {
  useEffect(() => {
    const onKeyDown = (event: KeyboardEvent) => {
      if (!(event.ctrlKey || event.metaKey) || event.altKey || isField(event.target)) return;
      const key = event.key.toLowerCase();
      if (key !== 'z' && key !== 'y') return;
      event.preventDefault();
      if (key === 'y' || event.shiftKey) redo();
      else undo();
    };
    addEventListener('keydown', onKeyDown);
    return () => removeEventListener('keydown', onKeyDown);
  }, [undo, redo]);
}

interface UndoButtonsProps {
  workspace: Workspace;
  className?: string;
}

export function UndoButtons({ workspace, className }: UndoButtonsProps) {
  const { undo, redo, canUndo, canRedo, canEdit } = workspace;
  if (!canEdit) return null;
  return (
    <div className={cn('flex', className)}>
      <button
        type="button"
        aria-label="Undo"
        title="Undo"
        disabled={!canUndo}
        onClick={undo}
        className={BUTTON}
      >
        <Arrow />
      </button>
      <button
        type="button"
        aria-label="Redo"
        title="Redo"
        disabled={!canRedo}
        onClick={redo}
        className={BUTTON}
      >
        <Arrow mirrored />
      </button>
    </div>
  );
}

function Arrow({ mirrored = false }: { mirrored?: boolean }) {
  return (
    <svg
      viewBox="0 0 18 14"
      width="18"
      height="14"
      aria-hidden="true"
      className={mirrored ? '-scale-x-100' : undefined}
    >
      <path d="M6 1 1.5 5 6 9M2 5h9a4.5 4 0 0 1 0 8H7" fill="none" stroke="currentColor" strokeWidth="1.6" />
    </svg>
  );
}

/** A field being typed in undoes its own text. */
function isField(target: EventTarget | null): boolean {
  return (
    target instanceof HTMLElement && (target.matches('input, textarea, select') || target.isContentEditable)
  );
}
