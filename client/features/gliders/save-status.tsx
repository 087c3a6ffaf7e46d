import { cn } from '#client/lib/cn.ts';
import { formatMoment } from '#client/lib/moments.ts';
import type { SaveState, Workspace } from '#client/lib/workspace.ts';

const WORDS: Record<SaveState, string> = {
  saved: 'Saved',
  saving: 'Saving …',
  unsaved: 'Not saved yet',
  offline: 'No connection, kept here',
  conflict: 'Changed elsewhere',
  invalid: 'Not saved: see above',
};

interface SaveStatusProps {
  workspace: Workspace;
  /** The mark alone, its words read aloud. */
  brief?: boolean;
}

/** Where the work is: on the server, on its way, or only here. */
export function SaveStatus({ workspace, brief = false }: SaveStatusProps) {
  const { words, mark, trouble } = statusOf(workspace);
  return (
    <span
      role="status"
      className={cn('whitespace-nowrap', trouble ? 'font-semibold text-ochre' : 'text-graphite')}
    >
      <span aria-hidden="true" className={cn('text-[0.75em]', !brief && 'mr-1.5')}>
        {mark}
      </span>
      <span className={brief ? 'sr-only' : undefined}>{words}</span>
    </span>
  );
}

interface Status {
  words: string;
  mark: '●' | '○' | '▲';
  trouble: boolean;
}

function statusOf({ kind, saveState, savedAt, canEdit, problem }: Workspace): Status {
  const calm = (words: string, mark: Status['mark'] = '○'): Status => ({ words, mark, trouble: false });
  const troubled = (words: string): Status => ({ words, mark: '▲', trouble: true });
  if (kind === 'sample')
    return saveState === 'invalid' ? troubled('Not valid yet') : calm('Sample, not stored');
  if (!canEdit) return calm('Read only');
  switch (saveState) {
    case 'saved':
      return calm(`${WORDS.saved} ${savedAt ? formatMoment(savedAt) : ''}`.trim(), '●');
    case 'saving':
      return calm(WORDS.saving);
    case 'unsaved':
      return problem === undefined ? calm(WORDS.unsaved) : troubled(WORDS.invalid);
    default:
      return troubled(WORDS[saveState]);
  }
}
