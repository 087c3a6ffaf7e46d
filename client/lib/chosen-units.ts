import { createContext } from 'react';
import type { ChosenUnits } from '#shared/format/units.ts';

const NONE: ChosenUnits = {};

/** The units that the reader chose; without formatting, so that the first page need not fetch it. */
export const ChosenUnitsContext = createContext<ChosenUnits>(NONE);

const KEY = 'featherbeam.units';

/** What was last chosen in this browser: a visitor's choice, or what the account said when it was last asked. */
export function storedUnits(): ChosenUnits {
  try {
    const value: unknown = JSON.parse(localStorage.getItem(KEY) ?? 'null');
    // A unit that does not belong to its quantity is passed over where it would be shown.
    return typeof value === 'object' && value !== null && !Array.isArray(value) ? value : NONE;
  } catch {
    return NONE;
  }
}

export function storeUnits(chosen: ChosenUnits): void {
  try {
    localStorage.setItem(KEY, JSON.stringify(chosen));
  } catch {
    // The choice then holds until the page is left.
  }
}
