import { randomUUID } from 'node:crypto';
import { mkdir, open, readFile, rename, rm } from 'node:fs/promises';
import { dirname, join } from 'node:path';
import type { FileStore } from './file-store.ts';

const KEY = /^[a-z]+\/[0-9a-z.-]+$/;

/** Keeps files in a folder, which is made when the first one comes. */
export function folderStore(folder: string): FileStore {
  const pathOf = (key: string) => {
    if (!KEY.test(key) || key.includes('..')) throw new Error(`“${key}” is no key of a file.`);
    return join(folder, key);
  };
  return {
    async write(key, bytes) {
      const path = pathOf(key);
      await mkdir(dirname(path), { recursive: true, mode: 0o700 });
      // Written beside and then moved, so that a file broken off never counts.
      const unfinished = `${path}.${randomUUID()}.unfinished`;
      try {
        const file = await open(unfinished, 'wx', 0o600);
        try {
          await file.writeFile(bytes);
          await file.sync();
        } finally {
          await file.close();
        }
        await rename(unfinished, path);
      } catch (error) {
        await rm(unfinished, { force: true });
        throw error;
      }
    },
    async read(key) {
      try {
        return await readFile(pathOf(key));
      } catch (error) {
        if (error instanceof Error && 'code' in error && error.code === 'ENOENT') return null;
        throw error;
      }
    },
    remove: (key) => rm(pathOf(key), { force: true }),
  };
}
