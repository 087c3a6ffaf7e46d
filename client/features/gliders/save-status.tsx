import type { ReactNode } from 'react';
import { cn } from '#client/lib/cn.ts';
import type { SaveState, Workspace } from '#client/lib/workspace.ts';
import { formatMoment } from '#client/lib/moments.ts';

const WORDS: Record<SaveState, string> = {
  saved: 'Saved',
  saving: 'Saving …',
  unsaved: 'Not saved yet',
  offline: 'No connection, kept here',
  conflict: 'Changed elsewhere',
  invalid: 'Not saved: see above',
};

/** Where the work is: on the server, on its way, or only here. */
export function SaveStatus({ workspace, brief = false }: { workspace: Workspace; brief?: boolean }) {
  const { kind, saveState, savedAt, canEdit, problem } = workspace;
  if (kind === 'sample')
    return <Line mark="○">{saveState === 'invalid' ? 'Not valid yet' : 'Sample, not stored'}</Line>;
  if (!canEdit) return <Line mark="○">Read only</Line>;
  const trouble = saveState === 'conflict' || saveState === 'invalid' || saveState === 'offline';
  const refused = saveState === 'unsaved' && problem !== undefined;
  return (
    <Line mark={saveState === 'saved' ? '●' : trouble || refused ? '▲' : '○'} trouble={trouble || refused}>
      {refused ? 'Not saved: see above' : WORDS[saveState]}
      {saveState === 'saved' && savedAt && !brief ? ` ${formatMoment(savedAt)}` : ''}
    </Line>
  );
}

function Line({ mark, trouble = false, children }: { mark: string; trouble?: boolean; children: ReactNode }) {
  return (
    <span
      role="status"
      className={cn('whitespace-nowrap', trouble ? 'font-semibold text-ochre' : 'text-graphite')}
    >
      <span aria-hidden="true" className="mr-1.5 text-[0.75em]">
        {mark}
      </span>
      {children}
    </span>
  );
}
