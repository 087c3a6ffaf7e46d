export const root: string;
export const cache: string;
export const isRoot: boolean;
export const home: string;
export function fromCaller(path: string): string;

export interface HomeQuestion {
  env: Record<string, string | undefined>;
  clone: string;
  asRoot: boolean;
  userHome: string;
}

/** `FEATHERBEAM_HOME` if set, else a folder outside the work tree that belongs to this clone alone. */
export function homeFor(question: HomeQuestion): string;
