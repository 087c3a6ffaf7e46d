import type { Trial, TrialTerms } from '#shared/core/wood-trial.ts';

export type PlanformFigure =
  'areaProjected' | 'areaDeveloped' | 'span' | 'aspectRatio' | 'mac' | 'xLeMac' | 'yMac';
export type AreaKind = 'projected' | 'developed' | 'class';
export type TrialFigure =
  | 'wingBare'
  | 'wingMass'
  | 'bare'
  | 'percentMac'
  | 'ballast'
  | 'allUp'
  | 'wingLoading'
  | 'classLoading'
  | 'margin';

/** A figure that can be asked how it was made. */
export type WhyQuestion =
  /** one line of the balance sheet: mass, arm, moment and their uncertainty */
  | { of: 'line'; id: string }
  /** a group of the balance sheet by its key */
  | { of: 'group'; key: string }
  | { of: 'total' }
  | { of: 'balance' }
  | { of: 'neutralPoint' }
  | { of: 'staticMargin' }
  /** the chord that balance is told by, of all wings together */
  | { of: 'chord' }
  | { of: 'planform'; surface: string; figure: PlanformFigure }
  | { of: 'area'; kind: AreaKind }
  | { of: 'loading'; kind: AreaKind }
  /** in air of a density, kg/m³ */
  | { of: 'speed'; lift: number; density: number }
  | { of: 'reynolds'; lift: number; density: number; viscosity: number }
  /** at a pressure altitude, m, and a temperature, °C */
  | { of: 'air'; altitude: number; temperature: number }
  /** at an arm, mm; to a wanted point, mm */
  | { of: 'ballast'; arm: number; to: number }
  | { of: 'tipWeight'; arm: number }
  /** at a station of the half span, mm, at a load factor */
  | { of: 'spar'; station: number; loadFactor: number }
  | { of: 'trial'; figure: TrialFigure; trial: Trial; terms: TrialTerms }
  /** from one trial to another, without ballast or all up */
  | { of: 'saving'; figure: 'bare' | 'allUp'; from: Trial; to: Trial; terms: TrialTerms };
