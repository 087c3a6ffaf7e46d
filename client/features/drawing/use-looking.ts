import { useState } from 'react';
import type { Surface } from '#shared/core/plan.ts';
import type { SideName } from '#shared/drawing/frames.ts';
import { tipLength } from '#shared/drawing/outline.ts';
import type { PlanViewName } from './figure/drawings.ts';

/** How the drawing is looked at, whatever it shows. */
export interface Looking {
  view: PlanViewName;
  setView: (view: PlanViewName) => void;
  side: SideName;
  setSide: (side: SideName) => void;
  measuring: boolean;
  setMeasuring: (measuring: boolean) => void;
}

export function useLooking(): Looking {
  const [view, setView] = useState<PlanViewName>('half');
  const [side, setSide] = useState<SideName>('starboard');
  const [measuring, setMeasuring] = useState(false);
  return { view, setView, side, setSide, measuring, setMeasuring };
}

/** A station on a surface or in its tip block, mm. */
export function cutAt(surface: Surface, side: SideName, station: number): number {
  const length = surface.panels.reduce((sum, panel) => sum + panel.span, tipLength(surface, side));
  return Math.max(0, Math.min(length, station));
}
