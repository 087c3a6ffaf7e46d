import { useEffect, useState, type FormEvent } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { Dialog } from '#client/components/ui/dialog.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import { formatMoment } from '#client/lib/moments.ts';
import type { GliderAbilities } from '#shared/schemas/glider.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import type { PhotoDto } from '#shared/schemas/photo.ts';
import { useCaptionPhoto, useDeletePhoto } from '../mutations.ts';

interface PhotoDialogProps {
  gliderId: string;
  photos: readonly PhotoDto[];
  /** id of the photo that is shown; null while it is closed */
  shown: string | null;
  onShow: (id: string | null) => void;
  /** the last one was deleted */
  onGone: () => void;
  can: Pick<GliderAbilities, 'captionPhoto' | 'deletePhoto'>;
}

/** One photo large, with its caption; the arrow keys lead to the others. */
export function PhotoDialog({ gliderId, photos, shown, onShow, onGone, can }: PhotoDialogProps) {
  const at = photos.findIndex(({ id }) => id === shown);
  const photo = photos[at];
  const [before, after] = photo ? [photos[at - 1], photos[at + 1]] : [];
  useArrows(before, after, onShow);
  return (
    <Dialog
      open={photo !== undefined}
      onOpenChange={(open) => {
        if (!open) onShow(null);
      }}
      title={photo && photo.caption !== '' ? photo.caption : 'Photo'}
      description={photo ? `Added by ${photo.addedBy}, ${formatMoment(photo.addedAt)}` : ''}
      full
    >
      {photo && (
        <>
          <img
            src={`/api/photos/${photo.id}/image`}
            alt={photo.caption === '' ? `Photo of ${formatMoment(photo.addedAt)}` : photo.caption}
            width={photo.width}
            height={photo.height}
            className="mx-auto h-auto max-h-[64dvh] w-auto max-w-full border border-rule bg-paper"
          />
          <div className="mt-3 flex items-center justify-between gap-3">
            <Step label="‹ Newer" to={before} onShow={onShow} keyName="ArrowLeft" />
            <span className="text-note text-graphite">
              {at + 1} of {photos.length}
            </span>
            <Step label="Older ›" to={after} onShow={onShow} keyName="ArrowRight" />
          </div>
          <PhotoTools
            key={photo.id}
            gliderId={gliderId}
            photo={photo}
            can={can}
            onGone={() => {
              const next = after ?? before;
              if (next) onShow(next.id);
              else onGone();
            }}
          />
        </>
      )}
    </Dialog>
  );
}

interface StepProps {
  label: string;
  to: PhotoDto | undefined;
  onShow: (id: string) => void;
  keyName: string;
}

/** Stays where it is at the end, so that the focus does too. */
function Step({ label, to, onShow, keyName }: StepProps) {
  return (
    <Button aria-keyshortcuts={keyName} aria-disabled={!to} onClick={() => to && onShow(to.id)}>
      {label}
    </Button>
  );
}

/** Left and right lead to the photos beside the one that is shown, but not out of a field. */
function useArrows(
  before: PhotoDto | undefined,
  after: PhotoDto | undefined,
  onShow: (id: string) => void,
): void {
  useEffect(() => {
    const onKeyDown = ({ key, target }: KeyboardEvent) => {
      if (target instanceof HTMLInputElement) return;
      const to = key === 'ArrowLeft' ? before : key === 'ArrowRight' ? after : undefined;
      if (to) onShow(to.id);
    };
    addEventListener('keydown', onKeyDown);
    return () => removeEventListener('keydown', onKeyDown);
  }, [before, after, onShow]);
}

interface PhotoToolsProps {
  gliderId: string;
  photo: PhotoDto;
  can: PhotoDialogProps['can'];
  onGone: () => void;
}

/** Caption and removal, for whoever may. */
function PhotoTools({ gliderId, photo, can, onGone }: PhotoToolsProps) {
  const [caption, setCaption] = useState(photo.caption);
  const [asked, setAsked] = useState(false);
  const captioning = useCaptionPhoto(gliderId);
  const deleting = useDeletePhoto(gliderId);
  const say = useToast();
  const save = (event: FormEvent) => {
    event.preventDefault();
    captioning.mutate({ id: photo.id, caption }, { onSuccess: () => say('The caption is saved.') });
  };
  const remove = () =>
    deleting.mutate(photo.id, {
      onSuccess: () => {
        say('The photo was deleted.');
        onGone();
      },
      onError: (error) => say(error.message),
    });
  return (
    <div className="mt-3 flex flex-wrap items-end justify-between gap-x-6 gap-y-2">
      {can.captionPhoto && (
        <form onSubmit={save} className="flex min-w-0 flex-1 basis-72 items-end gap-2">
          <div className="min-w-0 flex-1">
            <TextField
              label="Caption"
              value={caption}
              maxLength={LIMITS.caption.max}
              onChange={(event) => setCaption(event.target.value)}
              error={captioning.error ? captioning.error.message : undefined}
              keepRoom={false}
            />
          </div>
          <Button type="submit" pending={captioning.isPending} pendingText="Saving …">
            Save the caption
          </Button>
        </form>
      )}
      {can.deletePhoto &&
        (asked ? (
          <div className="flex flex-wrap items-center gap-2">
            <span>It cannot be brought back.</span>
            <Button onClick={() => setAsked(false)}>Keep it</Button>
            <Button variant="danger" onClick={remove} pending={deleting.isPending} pendingText="Deleting …">
              Delete the photo
            </Button>
          </div>
        ) : (
          <Button variant="plain" className="text-red" onClick={() => setAsked(true)}>
            Delete …
          </Button>
        ))}
    </div>
  );
}
