/** What a scale says in one line. */
export interface ScaleLine {
  /** g */
  mass: number;
  /** false while the figure still moves; null where the line does not say */
  stable: boolean | null;
}

/** How many grams the units of scales are (NIST SP 811, 2008, appendix B). */
const GRAMS: Readonly<Record<string, number>> = {
  g: 1,
  kg: 1000,
  mg: 0.001,
  oz: 28.349523125,
  lb: 453.59237,
  ct: 0.2,
};

/**
 * Reads a line as scales send it over a serial line: a number, mostly with its unit, sometimes with a mark that it
 * stands still (`ST`, `S`) or moves (`US`, `SD`, `?`). Common practice, no source: makers differ. Null for anything else.
 */
export function readScaleLine(line: string): ScaleLine | null {
  const found = /([+-]?)\s*(\d+(?:[.,]\d+)?)\s*(kg|mg|g|oz|lb|ct)?\b/i.exec(line);
  if (!found) return null;
  const [, sign = '', digits = '', unit = 'g'] = found;
  const mass = Number(digits.replace(',', '.')) * (GRAMS[unit.toLowerCase()] ?? 1) * (sign === '-' ? -1 : 1);
  if (!Number.isFinite(mass)) return null;
  const before = line.slice(0, found.index).toUpperCase();
  const after = line.slice(found.index + found[0].length).toUpperCase();
  const moves = /\b(US|SD)\b|\?/.test(before + after);
  const stands = /\b(ST|S)\b/.test(before) || /\bS\b/.test(after);
  return { mass, stable: moves ? false : stands ? true : null };
}

/** As far as a port is used here (Web Serial API, WICG draft). */
export interface ScalePort {
  open: (options: { baudRate: number }) => Promise<void>;
  close: () => Promise<void>;
  readable: ReadableStream<Uint8Array> | null;
}
export interface SerialDoor {
  requestPort: () => Promise<ScalePort>;
}

/** Where the browser has it; most telephones do not. */
export const serialDoor = (): SerialDoor | null =>
  'serial' in navigator ? (navigator.serial as SerialDoor) : null;

/** What most scales come set to, baud. */
const BAUD = 9600;
/** A line without an end this long is no scale’s. */
const LONGEST = 200;

/** Listens to a scale until `signal` ends it; each line that reads as a mass is told. */
export async function listenToScale(
  port: ScalePort,
  told: (line: ScaleLine) => void,
  signal: AbortSignal,
): Promise<void> {
  await port.open({ baudRate: BAUD });
  const reader = port.readable?.getReader();
  const stop = () => void reader?.cancel().catch(() => undefined);
  signal.addEventListener('abort', stop);
  try {
    const decoder = new TextDecoder();
    let text = '';
    for (;;) {
      const { value, done } = (await reader?.read()) ?? { done: true, value: undefined };
      if (done) return;
      text = (text + decoder.decode(value, { stream: true })).slice(-LONGEST);
      const lines = text.split(/[\r\n]+/);
      text = lines.pop() ?? '';
      for (const line of lines) {
        const read = readScaleLine(line);
        if (read) told(read);
      }
    }
  } finally {
    signal.removeEventListener('abort', stop);
    reader?.releaseLock();
    await port.close().catch(() => undefined);
  }
}
