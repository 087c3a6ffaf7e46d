/** Where files lie that people send: a folder, or an object store. Keys are paths of two parts, `photos/<name>`. */
export interface FileStore {
  /** Keeps the bytes whole or not at all. */
  write: (key: string, bytes: Buffer) => Promise<void>;
  /** null where there is no such file */
  read: (key: string) => Promise<Buffer | null>;
  /** Content where there is no such file. */
  remove: (key: string) => Promise<void>;
}
