import { useContext } from 'react';
import { unitsOf, type ChosenUnits, type Units } from '#shared/format/units.ts';
import { ChosenUnitsContext } from './chosen-units.ts';

const made = new WeakMap<ChosenUnits, Units>();

/** How the reader sees quantities; every figure on the screen goes through it. The same object for the same choice. */
export function useUnits(): Units {
  const chosen = useContext(ChosenUnitsContext);
  const units = made.get(chosen) ?? unitsOf(chosen);
  made.set(chosen, units);
  return units;
}
