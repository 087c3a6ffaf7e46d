import { useQuery } from '@tanstack/react-query';
import { useId, useRef, useState, type DragEvent } from 'react';
import { QueryView } from '#client/components/query-view.tsx';
import { Button } from '#client/components/ui/button.tsx';
import { useToast } from '#client/components/ui/toast.tsx';
import { cn } from '#client/lib/cn.ts';
import type { GliderAbilities } from '#shared/schemas/glider.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { logQueries } from '../queries.ts';
import { PhotoGrid } from './photo-grid.tsx';
import { UploadList } from './upload-list.tsx';
import { useUploads } from './use-uploads.ts';

interface PhotoSectionProps {
  gliderId: string;
  can: Pick<GliderAbilities, 'addPhoto' | 'captionPhoto' | 'deletePhoto'>;
}

const TYPES = 'image/jpeg,image/png,image/webp,image/avif';

/** Photos of the glider: what it looked like at the bench and at the field. */
export function PhotoSection({ gliderId, can }: PhotoSectionProps) {
  const query = useQuery(logQueries.photos(gliderId));
  const say = useToast();
  const uploads = useUploads(gliderId, say);
  const [over, setOver] = useState(false);
  const input = useRef<HTMLInputElement>(null);
  const heading = useRef<HTMLHeadingElement>(null);
  const id = useId();
  const count = query.data?.length ?? 0;
  const full = count >= LIMITS.photos.max;

  const add = (files: FileList | null) => {
    const pictures = [...(files ?? [])].filter(({ type }) => type.startsWith('image/'));
    const room = LIMITS.photos.max - count - uploads.list.length;
    if (pictures.length > room)
      say(`A glider keeps ${LIMITS.photos.max} photos; ${Math.max(0, room)} more fit.`);
    uploads.add(pictures.slice(0, Math.max(0, room)));
  };
  const drop = can.addPhoto && {
    onDragOver: (event: DragEvent) => {
      event.preventDefault();
      setOver(true);
    },
    onDragLeave: () => setOver(false),
    onDrop: (event: DragEvent) => {
      event.preventDefault();
      setOver(false);
      add(event.dataTransfer.files);
    },
  };

  return (
    <section aria-labelledby={id} {...drop} className={cn(over && 'outline-2 outline-offset-4 outline-ink')}>
      <div className="flex items-center justify-between gap-4">
        <h2 ref={heading} id={id} tabIndex={-1} className="caption">
          Photos
        </h2>
        {can.addPhoto && !full && (
          <>
            <Button onClick={() => input.current?.click()}>Add photos</Button>
            <input
              ref={input}
              type="file"
              accept={TYPES}
              multiple
              hidden
              aria-label="Photos to add"
              onChange={(event) => {
                add(event.target.files);
                event.target.value = '';
              }}
            />
          </>
        )}
      </div>
      <UploadList uploads={uploads} />
      <QueryView query={query}>
        {(photos) => (
          <>
            {photos.length + uploads.list.length === 0 && <Empty canAdd={can.addPhoto} />}
            <PhotoGrid
              gliderId={gliderId}
              photos={photos}
              can={can}
              onGone={() => heading.current?.focus()}
            />
          </>
        )}
      </QueryView>
    </section>
  );
}

function Empty({ canAdd }: { canAdd: boolean }) {
  return (
    <p className="mt-2 max-w-md text-graphite">
      {canAdd
        ? 'No photos yet. Bare structure before it is covered, the stab saddle, a repair: what a drawing does not show. Where and with what they were taken is removed.'
        : 'No photos yet.'}
    </p>
  );
}
