import { useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { formatMoment } from '#client/lib/moments.ts';
import type { GliderAbilities } from '#shared/schemas/glider.ts';
import type { PhotoDto } from '#shared/schemas/photo.ts';
import { PhotoDialog } from './photo-dialog.tsx';

interface PhotoGridProps {
  gliderId: string;
  photos: readonly PhotoDto[];
  can: Pick<GliderAbilities, 'captionPhoto' | 'deletePhoto'>;
  /** The dialog has closed over a photo that is no more, so that there is nothing to go back to. */
  onGone: () => void;
}

/** Photos shown before the rest is asked for. */
const FIRST = 12;

/** Thumbnails with their captions; one pressed opens large. */
export function PhotoGrid({ gliderId, photos, can, onGone }: PhotoGridProps) {
  const [shown, setShown] = useState<string | null>(null);
  const [all, setAll] = useState(false);
  const listed = all ? photos : photos.slice(0, FIRST);
  return (
    <>
      <ul className="mt-2 grid grid-cols-3 gap-3 empty:hidden">
        {listed.map((photo) => (
          <li key={photo.id}>
            <button
              type="button"
              onClick={() => setShown(photo.id)}
              className="block w-full rounded-sm text-left hover:text-ink"
            >
              <img
                src={`/api/photos/${photo.id}/thumbnail`}
                alt={photo.caption === '' ? `Photo of ${formatMoment(photo.addedAt)}` : ''}
                loading="lazy"
                className="aspect-square w-full border border-strong-rule bg-paper object-cover"
              />
              {photo.caption !== '' && (
                <span className="mt-1 line-clamp-2 block text-note">{photo.caption}</span>
              )}
            </button>
          </li>
        ))}
      </ul>
      {listed.length < photos.length && (
        <Button className="mt-3" onClick={() => setAll(true)}>
          Show all {photos.length} photos
        </Button>
      )}
      <PhotoDialog
        gliderId={gliderId}
        photos={photos}
        shown={shown}
        onShow={setShown}
        can={can}
        onGone={() => {
          setShown(null);
          // After the dialog has given the focus back.
          setTimeout(onGone);
        }}
      />
    </>
  );
}
