import { createContext, useContext } from 'react';
import { USUAL_UNITS, type Units } from '#shared/format/units.ts';

export const UnitsContext = createContext<Units>(USUAL_UNITS);

/** How the reader sees quantities; every figure on the screen goes through it. */
export function useUnits(): Units {
  return useContext(UnitsContext);
}
