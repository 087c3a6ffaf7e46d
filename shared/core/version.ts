/**
 * Version of the calculator, kept with every frozen result. Raise it when the same plan would give another
 * figure: the second number for a change of method, the third for a slip mended.
 */
export const CALCULATOR_VERSION = '1.0.0';
