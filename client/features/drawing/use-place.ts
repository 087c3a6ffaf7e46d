import { useState } from 'react';
import { ribStations } from '#shared/core/half.ts';
import type { Part, Plan, Surface } from '#shared/core/plan.ts';
import { ribNumbers } from '#shared/drawing/marks.ts';
import { existingTab, placeOfLine, sameTab, type Tab } from './edits/line-id.ts';

interface Place {
  tab: Tab;
  setTab: (tab: Tab) => void;
  /** where the section of the surface at hand is taken, mm from its root */
  station: number;
  setStation: (s: number) => void;
}

/**
 * Which surface is on the board and where it is cut. Both follow what is picked, here or on another page of the
 * glider: its surface comes to hand, and the cut moves to where the part is, if it is not there already.
 */
export function usePlace(plan: Plan, selected: string | null): Place {
  const [tab, setTab] = useState<Tab>(
    () => placeOfLine(plan, selected)?.tab ?? { kind: 'surface', index: 0 },
  );
  const [seen, setSeen] = useState<string | null>(null);
  const [stations, setStations] = useState<Readonly<Record<number, number>>>({});
  const now = existingTab(plan, tab);
  const surface = now.kind === 'surface' ? plan.surfaces[now.index] : undefined;
  const station = surface && now.kind === 'surface' ? (stations[now.index] ?? middleRib(surface)) : 0;

  if (seen !== selected) {
    setSeen(selected);
    const place = placeOfLine(plan, selected);
    if (place && !sameTab(place.tab, now)) setTab(place.tab);
    if (place?.tab.kind === 'surface') {
      const { index } = place.tab;
      const own = plan.surfaces[index];
      const part = own?.parts.find(({ id }) => id === place.id);
      const at = own && part && stationOn(part, stations[index] ?? middleRib(own));
      if (at !== undefined) setStations({ ...stations, [index]: at });
    }
  }
  return {
    tab: now,
    setTab,
    station,
    setStation: (s) => {
      if (now.kind === 'surface') setStations({ ...stations, [now.index]: s });
    },
  };
}

/** A station where a section shows something: the rib nearest the middle of the half, or the middle itself. */
function middleRib(surface: Surface): number {
  const middle = surface.panels.reduce((sum, panel) => sum + panel.span, 0) / 2;
  const ribs = ribNumbers(surface);
  return ribs.reduce(
    (best, s) => (Math.abs(s - middle) < Math.abs(best - middle) ? s : best),
    ribs[0] ?? middle,
  );
}

/** The station moved to where a part is cut, if it is not there already. */
function stationOn(part: Part, station: number): number {
  if (part.kind === 'ribs') {
    const own = ribStations(part);
    return own.reduce(
      (best, s) => (Math.abs(s - station) < Math.abs(best - station) ? s : best),
      own[0] ?? station,
    );
  }
  if (!('from' in part) || part.from === undefined || part.to === undefined) return station;
  const [low, high] = [Math.min(part.from, part.to), Math.max(part.from, part.to)];
  return Math.min(high, Math.max(low, station));
}
