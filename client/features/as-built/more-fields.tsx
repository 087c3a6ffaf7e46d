import { useState } from 'react';
import { NumberField } from '#client/components/ui/number-field.tsx';
import { TextField } from '#client/components/ui/text-field.tsx';
import { sendPhoto } from '#client/lib/photo/send-photo.ts';
import { shrunk } from '#client/lib/photo/shrink.ts';
import type { PhotoDto } from '#shared/schemas/photo.ts';

/** What else was seen at the scale. */
export interface More {
  /** where the set balanced, mm aft of the datum */
  x: number | null;
  /** of the one material on the scale */
  density: number | null;
  thickness: number | null;
  photo: PhotoDto | null;
  note: string;
}
export const NO_MORE: More = { x: null, density: null, thickness: null, photo: null, note: '' };

interface MoreFieldsProps {
  gliderId: string;
  more: More;
  onMore: (more: More) => void;
}

/** Balance point, measured density and thickness, photo and note: what tells why a part ran over. */
export function MoreFields({ gliderId, more, onMore }: MoreFieldsProps) {
  const [words, setWords] = useState('');
  const send = async (file: File | undefined) => {
    if (!file) return;
    setWords('Sending …');
    try {
      const added = await sendPhoto({
        gliderId,
        file: await shrunk(file),
        name: file.name,
        wish: crypto.randomUUID(),
        onProgress: () => undefined,
        signal: new AbortController().signal,
      });
      onMore({ ...more, photo: added });
      setWords('The photo is kept.');
    } catch (error) {
      setWords(error instanceof Error ? error.message : 'It could not be sent.');
    }
  };
  return (
    <details>
      <summary className="opens text-note font-semibold">Balance point, wood, photo, note</summary>
      <div className="mt-2 grid grid-cols-1 gap-x-6 sm:grid-cols-2 lg:grid-cols-4">
        <NumberField
          label="It balances aft of the datum at"
          quantity="length"
          value={more.x}
          min={-20_000}
          max={20_000}
          optional
          onChange={(x) => onMore({ ...more, x })}
        />
        <NumberField
          label="Density of its wood, weighed"
          quantity="density"
          value={more.density}
          above={0}
          max={25_000}
          optional
          onChange={(density) => onMore({ ...more, density })}
        />
        <NumberField
          label="Thickness, measured"
          quantity="length"
          value={more.thickness}
          above={0}
          max={20_000}
          optional
          onChange={(thickness) => onMore({ ...more, thickness })}
        />
        <TextField
          label="Note"
          value={more.note}
          maxLength={2000}
          onChange={({ currentTarget }) => onMore({ ...more, note: currentTarget.value })}
        />
      </div>
      <label className="flex min-h-row flex-wrap items-center gap-x-3 text-note pointer-coarse:min-h-11">
        <span className="font-semibold">Photo</span>
        <input
          type="file"
          aria-label="Photo"
          accept="image/jpeg,image/png,image/webp,image/avif"
          capture="environment"
          onChange={({ currentTarget }) => void send(currentTarget.files?.[0])}
        />
        <span role="status" className="text-graphite">
          {more.photo === null && words === 'The photo is kept.' ? '' : words}
        </span>
      </label>
    </details>
  );
}
