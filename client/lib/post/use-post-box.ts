import { useEffect, useSyncExternalStore } from 'react';
import { PostBox, sendRecord, type WaitingRecord } from './post-box.ts';

const boxes = new Map<string, PostBox>();
/** A line that comes back without a word is tried again after this, ms. */
const AGAIN = 20_000;

/** The box of a person in this window. */
export function postBoxOf(person: string): PostBox {
  const known = boxes.get(person);
  if (known) return known;
  const alone = async (name: string, work: () => Promise<void>) => {
    // Two windows of one browser send one after the other; the key makes it once even where they cannot.
    if ('locks' in navigator) await navigator.locks.request(name, work);
    else await work();
  };
  const box = new PostBox(person, { storage: localStorage, send: sendRecord, alone });
  boxes.set(person, box);
  return box;
}

/** What of a glider waits to be sent; sends it whenever there may be a way. */
export function usePostBox(person: string, gliderId: string): { box: PostBox; waiting: WaitingRecord[] } {
  const box = postBoxOf(person);
  const records = useSyncExternalStore(
    (listener) => box.subscribe(listener),
    () => box.records,
  );
  useEffect(() => keepSending(box), [box]);
  return { box, waiting: records.filter((record) => record.gliderId === gliderId) };
}

/** Sends when the line is back, when the window is looked at again, and now and then. */
export function keepSending(box: PostBox): () => void {
  const send = () => void box.send();
  const seen = () => {
    if (document.visibilityState === 'visible') send();
  };
  const other = () => box.refresh();
  const timer = setInterval(() => {
    if (box.records.some(({ refused }) => refused === null)) send();
  }, AGAIN);
  window.addEventListener('online', send);
  window.addEventListener('storage', other);
  document.addEventListener('visibilitychange', seen);
  send();
  return () => {
    clearInterval(timer);
    window.removeEventListener('online', send);
    window.removeEventListener('storage', other);
    document.removeEventListener('visibilitychange', seen);
  };
}
