import { cn } from '#client/lib/cn.ts';
import type { Workspace } from '#client/lib/workspace.ts';

const BUTTON =
  'grid size-row place-items-center rounded-md text-ink enabled:hover:bg-ink-wash disabled:text-graphite disabled:opacity-50';

interface UndoButtonsProps {
  workspace: Pick<Workspace, 'undo' | 'redo' | 'canUndo' | 'canRedo' | 'canEdit'>;
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
        title="Undo (Ctrl+Z)"
        aria-keyshortcuts="Control+Z"
        disabled={!canUndo}
        onClick={undo}
        className={BUTTON}
      >
        <Arrow />
      </button>
      <button
        type="button"
        aria-label="Redo"
        title="Redo (Ctrl+Shift+Z)"
        aria-keyshortcuts="Control+Shift+Z"
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
