export class HouseError extends Error {}
export function say(line: string): void;

/** The sentence for a failure that programs report in their own words, or null for an unknown one. */
export function explain(output: string, step?: 'packages' | 'debian'): string | null;
export function wording(error: unknown): string;
