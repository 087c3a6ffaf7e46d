import { useEffect, useRef, useState } from 'react';
import { Button } from '#client/components/ui/button.tsx';
import { useUnits } from '#client/lib/units.ts';
import { listenToScale, serialDoor, type ScaleLine } from './serial-scale.ts';

/** Reads a scale on a serial line, where the browser can; the reading is taken with a press, never by itself. */
export function ScaleButton({ onTake }: { onTake: (mass: number) => void }) {
  const units = useUnits();
  const [line, setLine] = useState<ScaleLine | null>(null);
  const [state, setState] = useState<'off' | 'on' | 'lost'>('off');
  const stop = useRef<AbortController | null>(null);
  useEffect(() => () => stop.current?.abort(), []);
  const door = serialDoor();
  if (!door) return null;

  const connect = async () => {
    try {
      const port = await door.requestPort();
      const own = new AbortController();
      stop.current = own;
      setState('on');
      await listenToScale(port, setLine, own.signal);
      setState(own.signal.aborted ? 'off' : 'lost');
    } catch (error) {
      // Nothing was picked in the browser’s own list.
      setState(error instanceof DOMException && error.name === 'NotFoundError' ? 'off' : 'lost');
    }
    setLine(null);
  };
  if (state !== 'on') {
    return (
      <div className="flex flex-wrap items-center gap-x-3">
        <Button variant="plain" onClick={() => void connect()}>
          Read a scale on a cable
        </Button>
        {state === 'lost' && <span className="text-note text-graphite">The scale cannot be heard.</span>}
      </div>
    );
  }
  const isStill = line !== null && line.stable !== false;
  return (
    <div className="flex flex-wrap items-center gap-x-2">
      <Button disabled={!isStill} onClick={() => line && onTake(line.mass)}>
        {line === null ? 'Waiting for the scale …' : `Take ${units.format(line.mass, 'mass')}`}
      </Button>
      {line?.stable === false && <span className="text-note text-graphite">not still yet</span>}
      <Button variant="plain" onClick={() => stop.current?.abort()}>
        Let go of it
      </Button>
    </div>
  );
}
