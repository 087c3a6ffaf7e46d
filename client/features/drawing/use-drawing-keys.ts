import type { RefObject } from 'react';
import { useShortcuts } from '#client/components/shortcuts/shortcut-book.ts';
import type { Plan } from '#shared/core/plan.ts';
import { ribNumbers } from '#shared/drawing/marks.ts';
import type { Tab } from './edits/line-id.ts';
import type { FocusWish } from './lists/focus-wish.ts';
import type { Looking } from './use-looking.ts';

interface DrawingKeys {
  /** the place, whose list, drawing and buttons the keys go to */
  root: RefObject<HTMLElement | null>;
  plan: Plan;
  tab: Tab;
  picked: string | null;
  pick: (line: string | null) => void;
  wish: FocusWish;
  looking: Looking;
  station: number;
  setStation: (s: number) => void;
  print: () => void;
}

/** What single keys do on the drawing. */
export function useDrawingKeys(keys: DrawingKeys): void {
  const { root, plan, tab, picked, pick, wish, looking, station, setStation } = keys;
  const surface = tab.kind === 'surface' ? plan.surfaces[tab.index] : undefined;
  const focus = (selector: string) => root.current?.querySelector<HTMLElement>(selector)?.focus();
  const step = (by: 1 | -1) => {
    const lines = linesOf(plan, tab);
    const at = picked === null ? -1 : lines.indexOf(picked);
    const next = lines[at < 0 ? (by === 1 ? 0 : lines.length - 1) : at + by];
    if (next === undefined) return;
    wish.ask(next, 'row');
    pick(next);
  };
  const rib = (by: 1 | -1) => {
    const ribs = surface ? ribNumbers(surface) : [];
    const next = by === 1 ? ribs.find((s) => s > station + 1e-6) : ribs.findLast((s) => s < station - 1e-6);
    if (next !== undefined) setStation(next);
  };
  useShortcuts('Drawing', [
    { keys: '1', what: 'The surface laid flat', run: () => looking.setView('half') },
    { keys: '2', what: 'The model from above', run: () => looking.setView('whole') },
    { keys: '3', what: 'The model from the side', run: () => looking.setView('side') },
    { keys: '4', what: 'The model from ahead', run: () => looking.setView('front') },
    { keys: 'n', what: 'Section at the next rib', run: () => rib(1) },
    { keys: 'b', what: 'Section at the rib before', run: () => rib(-1) },
    { keys: 'm', what: 'Measure', run: () => looking.setMeasuring(!looking.measuring) },
    { keys: 'p', what: 'Print to scale', run: keys.print },
  ]);
  useShortcuts('Parts', [
    { keys: 'j', what: 'Next part', run: () => step(1) },
    { keys: 'k', what: 'Part before', run: () => step(-1) },
    { keys: 'l', what: 'To the list', run: () => focus('[data-row]') },
    { keys: 'a', what: 'To the button that adds', run: () => focus('[data-add] button') },
    { keys: 'd', what: 'To the drawing', run: () => focus('[role="application"]') },
  ]);
  useShortcuts('In the drawing', [
    { keys: '+ −', what: 'Larger and smaller; so does the wheel' },
    { keys: '0', what: 'Fit the drawing' },
    { keys: '← ↑ ↓ →', what: 'Push the drawing; move the measuring cross; on a handle, move it by a step' },
    { keys: 'Shift', what: 'With the arrows: ten steps' },
    { keys: 'Enter', what: 'While measuring: put a point down' },
    { keys: 'Tab', what: 'On to the handles of what is picked' },
  ]);
}

function linesOf(plan: Plan, tab: Tab): string[] {
  switch (tab.kind) {
    case 'surface': {
      const surface = plan.surfaces[tab.index];
      return surface?.parts.map(({ id }) => `${surface.key}/${id}`) ?? [];
    }
    case 'solids':
      return plan.solids.map(({ id }) => `solid/${id}`);
    case 'items':
      return plan.items.map(({ id }) => `item/${id}`);
  }
}
