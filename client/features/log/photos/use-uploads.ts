import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useRef, useState } from 'react';
import { ApiError } from '#client/lib/api.ts';
import { LIMITS } from '#shared/schemas/limits.ts';
import { logQueries } from '../queries.ts';
import { sendPhoto } from '#client/lib/photo/send-photo.ts';
import { shrunk } from '#client/lib/photo/shrink.ts';

/** A photo on its way, or one that did not get there. */
export interface Upload {
  id: string;
  file: File;
  /** 0–1 */
  progress: number;
  /** why it did not get there */
  problem: string | null;
}

export interface Uploads {
  list: readonly Upload[];
  add: (files: readonly File[]) => void;
  retry: (id: string) => void;
  drop: (id: string) => void;
}

/** Sends photos one after the other; what fails stays in the list until it is tried again or dropped. */
export function useUploads(gliderId: string, say: (text: string) => void): Uploads {
  const client = useQueryClient();
  const [list, setList] = useState<readonly Upload[]>([]);
  const stops = useRef(new Map<string, AbortController>());
  const queue = useRef(Promise.resolve());
  const change = (id: string, changes: Partial<Upload>) =>
    setList((all) => all.map((one) => (one.id === id ? { ...one, ...changes } : one)));

  const shown = useRef(false);
  useEffect(() => {
    shown.current = true;
    return () => {
      shown.current = false;
    };
  }, []);
  const onItsWay = list.some(({ problem }) => problem === null);
  useEffect(() => {
    if (!onItsWay) return;
    const warn = (event: BeforeUnloadEvent) => event.preventDefault();
    addEventListener('beforeunload', warn);
    return () => removeEventListener('beforeunload', warn);
  }, [onItsWay]);

  const send = async (id: string, file: File) => {
    const stop = new AbortController();
    stops.current.set(id, stop);
    const before = queue.current;
    let done = () => {};
    queue.current = new Promise((resolve) => (done = resolve));
    try {
      await before;
      if (stop.signal.aborted) return;
      const small = await shrunk(file);
      await sendPhoto({
        gliderId,
        file: small,
        name: file.name,
        wish: id,
        onProgress: (progress) => change(id, { progress }),
        signal: stop.signal,
      });
      setList((all) => all.filter((one) => one.id !== id));
      say(`${file.name} was added.`);
      await client.invalidateQueries({ queryKey: logQueries.photos(gliderId).queryKey });
    } catch (error) {
      if (stop.signal.aborted) return;
      change(id, { problem: problemOf(error) });
      // Photos go on being sent while the reader is at another place.
      if (!shown.current) say(`${file.name} was not added. ${problemOf(error)}`);
    } finally {
      done();
    }
  };

  return {
    list,
    add: (files) => {
      const fresh = files.map((file): Upload => ({
        id: crypto.randomUUID(),
        file,
        progress: 0,
        problem: null,
      }));
      setList((all) => [...all, ...fresh]);
      for (const { id, file } of fresh) void send(id, file);
    },
    retry: (id) => {
      const upload = list.find((one) => one.id === id);
      if (!upload) return;
      change(id, { problem: null, progress: 0 });
      void send(id, upload.file);
    },
    drop: (id) => {
      stops.current.get(id)?.abort();
      setList((all) => all.filter((one) => one.id !== id));
    },
  };
}

function problemOf(error: unknown): string {
  if (error instanceof ApiError) {
    if (error.status === 413) return `It is larger than ${LIMITS.photoBytes.max / 1_000_000} MB.`;
    if (error.status === 415) return 'It is no photo that can be kept: use JPEG, PNG, WebP or AVIF.';
    return error.fields.map(({ detail }) => detail).join(' ') || error.message;
  }
  return error instanceof Error ? error.message : 'It could not be sent.';
}
