/** One file of the built client, as the bundler hands it over. */
export interface BuiltChunk {
  type: string;
  fileName: string;
  code?: string;
  imports?: string[];
  isEntry?: boolean;
  facadeModuleId?: string | null;
}

export interface PageSize {
  page: string;
  /** kB of JavaScript, gzip, before the page is usable */
  size: number;
  /** kB that it may take */
  budget: number;
}

export declare const BUDGETS: readonly { page: string; budget: number; modules: readonly string[] }[];
export declare const SIZES: string;
export declare function pageSizes(chunks: readonly BuiltChunk[]): PageSize[];
export declare function bundleSizes(): {
  name: string;
  apply: 'build';
  writeBundle(options: { dir?: string | undefined }, bundle: Record<string, BuiltChunk>): void;
};
