import { Link } from 'react-router-dom';
import { Button, buttonClass } from '#client/components/ui/button.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import type { Workspace } from '#client/lib/workspace.ts';
import { useCreateGlider } from './mutations.ts';
import type { SampleDesk } from './sample-desk.ts';
import { useWish } from './use-wish.ts';

interface SampleNoticeProps {
  workspace: Workspace;
  sample: SampleDesk;
  signedIn: boolean;
  signUpHref: string;
  onOpen: (gliderId: string) => void;
}

/** Says quietly that the sample is not stored, and how to keep it. */
export function SampleNotice({ workspace, sample, signedIn, signUpHref, onOpen }: SampleNoticeProps) {
  const create = useCreateGlider();
  const wish = useWish();
  const say = useToast();
  const keep = () => {
    const { check } = sample.getDesk();
    if (!check.ok) return say('First mend what is not valid.');
    create.mutate(
      { plan: check.plan, wish: wish.current() },
      {
        onSuccess: ({ id, name }) => {
          wish.granted();
          say(`${name} lies on your bench.`);
          onOpen(id);
        },
        onError: (error) => say(error.message),
      },
    );
  };

  return (
    <div className="flex flex-wrap items-center gap-x-2 text-note text-graphite max-sm:mb-1">
      <span>Sample: nothing is stored{signedIn ? '.' : '; sign up to keep it.'}</span>
      {signedIn ? (
        <Button
          variant="plain"
          className="text-note"
          onClick={keep}
          pending={create.isPending}
          pendingText="Saving …"
        >
          Save a copy to the bench
        </Button>
      ) : (
        <Link to={signUpHref} className={buttonClass('plain', 'text-note')}>
          Sign up
        </Link>
      )}
      {workspace.canUndo && (
        <Button variant="plain" className="text-note" onClick={sample.startAgain}>
          Start again
        </Button>
      )}
    </div>
  );
}
