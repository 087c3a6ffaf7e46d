/** One file that the service worker keeps; `revision` null where its name carries its content. */
export interface BuiltFile {
  url: string;
  revision: string | null;
}

/** `build` of Vite, as far as it is needed here. */
export type Build = (config: object) => Promise<unknown>;

export declare function builtFiles(folder: string): BuiltFile[];
export declare function offlineBuild(build: Build): {
  name: string;
  apply: 'build';
  writeBundle(options: { dir?: string | undefined }): void;
  closeBundle(): Promise<void>;
};
