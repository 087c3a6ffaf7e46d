/** One file that the service worker keeps; `revision` null where its name carries its content. */
export interface BuiltFile {
  url: string;
  revision: string | null;
}

export declare function builtFiles(folder: string): BuiltFile[];
export declare function offlineBuild(): {
  name: string;
  apply: 'build';
  writeBundle(options: { dir?: string | undefined }): void;
  closeBundle(): Promise<void>;
};
