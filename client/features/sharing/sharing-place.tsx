import { useQuery } from '@tanstack/react-query';
import { QueryView } from '#client/components/query-view.tsx';
import type { GliderDto } from '#shared/schemas/glider.ts';
import type { MemberDto } from '#shared/schemas/sharing.ts';
import { HandOver } from './hand-over.tsx';
import { Invitations } from './invitations.tsx';
import { Leave } from './leave.tsx';
import { MembersTable } from './members-table.tsx';
import { sharingQueries } from './queries.ts';
import { ReadLink } from './read-link.tsx';
import { roleMay } from './role-words.ts';

interface SharingPlaceProps {
  glider: GliderDto;
  accountHref: string;
  /** the reader is no longer a member */
  onLeft: () => void;
}

/** Who may see a glider and what they may do; the owner shares it, hands it over and switches its link. */
export function SharingPlace({ glider, accountHref, onLeft }: SharingPlaceProps) {
  const query = useQuery(sharingQueries.members(glider.id));
  return (
    <QueryView query={query}>
      {({ members }) => (
        <div className="grid max-w-3xl grid-cols-1 gap-y-9">
          <header>
            <h1 className="text-figure font-semibold">{headline(glider.name, members)}</h1>
            <p className="mt-1 text-graphite">
              {glider.can.share
                ? 'A builder draws with you, a pilot weighs and flies, a reader looks on. Nobody but you can delete it or share it on.'
                : `You are its ${glider.role}: a ${glider.role} ${roleMay(glider.role)}.`}
            </p>
          </header>
          <MembersTable glider={glider} members={members} />
          {glider.can.share && (
            <>
              <Invitations gliderId={glider.id} accountHref={accountHref} />
              <ReadLink gliderId={glider.id} />
            </>
          )}
          {glider.can.transfer && <HandOver glider={glider} members={members} />}
          {glider.can.leave && <Leave glider={glider} onLeft={onLeft} />}
        </div>
      )}
    </QueryView>
  );
}

function headline(name: string, members: readonly MemberDto[]): string {
  const others = members.filter(({ you }) => !you).length;
  if (others === 0) return `${name} is yours alone`;
  return others === 1 ? `${name} is shared with one other` : `${name} is shared with ${others} others`;
}
