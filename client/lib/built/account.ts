import type { WaitingRecord } from '#client/lib/post/post-box.ts';
import { readingOf } from '#shared/core/built/reading.ts';
import type { Weighing } from '#shared/core/built/weighing.ts';
import { weighingInput, type WeighingDto, type WeighingInput } from '#shared/schemas/weighing.ts';

/** A weighing as the page shows it: on the server, or still on this device. */
export interface Noted {
  /** id on the server, or the key under which it is sent */
  id: string;
  input: WeighingInput;
  /** null while it is on the device */
  number: number | null;
  by: string | null;
  /** readings less tare, g; null for one that only takes another back */
  mass: number | null;
  u: number | null;
  /** the later one that counts in its place */
  correctedBy: string | null;
  /** why the server will not take it */
  refused: string | null;
}

const inputOf = ({
  id: _,
  number: __,
  mass: ___,
  u: ____,
  weighedBy: _____,
  receivedAt: ______,
  correctedBy: _______,
  ...input
}: WeighingDto): WeighingInput => input;

/** What is on the server, then what waits on this device. */
export function notedOf(kept: readonly WeighingDto[], waiting: readonly WaitingRecord[]): Noted[] {
  const onServer = kept.map((one): Noted => ({
    id: one.id,
    input: inputOf(one),
    number: one.number,
    by: one.weighedBy,
    mass: one.mass,
    u: one.u,
    correctedBy: one.correctedBy,
    refused: null,
  }));
  const here = waiting.flatMap((record): Noted[] => {
    const parsed = weighingInput.safeParse(record.body);
    if (record.kind !== 'weighing' || !parsed.success) return [];
    const input = parsed.data;
    const reading = input.withdraws ? null : readingOf(input);
    return [
      {
        id: record.key,
        input,
        number: null,
        by: null,
        mass: reading?.mass ?? null,
        u: reading?.u ?? null,
        correctedBy: null,
        refused: record.refused,
      },
    ];
  });
  const corrections = new Map(
    here.flatMap(({ id, input }) => (input.corrects === null ? [] : [[input.corrects, id]])),
  );
  return [
    ...onServer.map((one) => ({ ...one, correctedBy: one.correctedBy ?? corrections.get(one.id) ?? null })),
    ...here,
  ];
}

/** Weighings that count, a correction in the place of what it corrects. */
export function countedOf(noted: readonly Noted[]): (Weighing & { title: string })[] {
  const byId = new Map(noted.map((one) => [one.id, one]));
  const latest = (one: Noted): Noted => {
    const next = one.correctedBy === null ? undefined : byId.get(one.correctedBy);
    return next ? latest(next) : one;
  };
  return noted
    .filter(({ input }) => input.corrects === null)
    .map(latest)
    .flatMap(({ id, mass, u, input }) => {
      if (mass === null || u === null) return [];
      const { covers, title, x } = input;
      return [{ id, title, covers, mass, u, ...(x !== null && { x }) }];
    });
}
