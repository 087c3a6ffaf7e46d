import { useQuery } from '@tanstack/react-query';
import { useRef } from 'react';
import { QueryView } from '#client/components/query-view.tsx';
import { Button } from '#client/components/ui/button.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import type { ReadLinkDto } from '#shared/schemas/sharing.ts';
import { useReadLink } from './mutations.ts';
import { Part } from './part.tsx';
import { sharingQueries } from './queries.ts';

/** A link that shows the glider to whoever has it, and can be switched off. */
export function ReadLink({ gliderId }: { gliderId: string }) {
  const query = useQuery(sharingQueries.link(gliderId));
  const change = useReadLink(gliderId);
  const say = useToast();
  const turn = (on: boolean) =>
    void change.mutateAsync(on).then(
      () => say(on ? 'The link is on.' : 'The link is off; whoever has it sees nothing any more.'),
      (error: Error) => say(error.message),
    );
  return (
    <Part
      title="Read-only link"
      note="Whoever has the link sees the drawing, the balance and the loading as they are at that moment, without an account. They see no log, no sheets, no members."
    >
      <QueryView query={query}>
        {({ link }) =>
          link ? (
            <LinkOn link={link} pending={change.isPending} onOff={() => turn(false)} />
          ) : (
            <Button pending={change.isPending} onClick={() => turn(true)}>
              Switch the link on
            </Button>
          )
        }
      </QueryView>
    </Part>
  );
}

interface LinkOnProps {
  link: ReadLinkDto;
  pending: boolean;
  onOff: () => void;
}

function LinkOn({ link, pending, onOff }: LinkOnProps) {
  const input = useRef<HTMLInputElement>(null);
  const say = useToast();
  const address = new URL(link.path, location.origin).href;
  const copy = async () => {
    try {
      await navigator.clipboard.writeText(address);
      say('The link is copied.');
    } catch {
      // Without leave to the clipboard the reader copies by hand.
      input.current?.select();
      say('The link is marked; copy it with Ctrl+C.');
    }
  };
  return (
    <div className="flex flex-wrap items-end gap-3">
      <div className="min-w-[min(16rem,100%)] flex-1">
        <TextField
          label="Link"
          inputRef={input}
          readOnly
          keepRoom={false}
          value={address}
          onFocus={(event) => event.target.select()}
        />
      </div>
      <Button variant="primary" onClick={() => void copy()}>
        Copy
      </Button>
      <Button variant="danger" pending={pending} onClick={onOff}>
        Switch it off
      </Button>
    </div>
  );
}
