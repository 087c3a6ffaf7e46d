import { useRef, useState } from 'react';
import { FITTED, panned, zoomedAt, type Laid, type Zoom } from '#client/components/drawing/sheet.ts';
import type { Bounds, Point } from '#shared/drawing/shape.ts';

interface Zooming {
  zoom: Zoom;
  fit: () => void;
  /** larger by a factor about a place, px; false where there is no going further */
  zoomBy: (by: number, at: Point, paper: Laid) => boolean;
  pan: (dx: number, dy: number, bounds: Bounds, paper: Laid) => void;
}

/** How a view is looked at. Another view begins fitted. */
export function useZoom(view: string): Zooming {
  const [held, setHeld] = useState({ view, zoom: FITTED });
  const zoom = held.view === view ? held.zoom : FITTED;
  // Several turns of a wheel come before the next picture.
  const latest = useRef({ view, zoom });
  const set = (next: Zoom) => {
    latest.current = { view, zoom: next };
    setHeld(latest.current);
  };
  const now = () => (latest.current.view === view ? latest.current.zoom : FITTED);
  return {
    zoom,
    fit: () => set(FITTED),
    zoomBy: (by, at, paper) => {
      const before = now();
      const next = zoomedAt(before, by, at, paper.middle);
      if (next.factor === before.factor) return false;
      set(next);
      return true;
    },
    pan: (dx, dy, bounds, paper) => {
      if (now().factor > 1) set(panned(now(), dx, dy, bounds, paper));
    },
  };
}
