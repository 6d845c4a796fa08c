import { randomUUID } from 'node:crypto';
import { mkdir, open, readFile, rename, rm } from 'node:fs/promises';
import { dirname, join } from 'node:path';
import { isStorageKey, type Storage } from './storage';

const isMissing = (error: unknown): boolean => (error as NodeJS.ErrnoException).code === 'ENOENT';

/** Keeps files under a folder. A file appears whole or not at all, and is on the disk when `put` returns. */
export function diskStorage(folder: string): Storage {
  const pathOf = (key: string): string => {
    if (!isStorageKey(key)) throw new RangeError('This is no storage key');
    return join(folder, key);
  };
  return {
    async put(key, bytes) {
      const path = pathOf(key);
      await mkdir(dirname(path), { recursive: true, mode: 0o700 });
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
    async get(key) {
      try {
        return await readFile(pathOf(key));
      } catch (error) {
        if (isMissing(error)) return null;
        throw error;
      }
    },
    remove: (key) => rm(pathOf(key), { force: true }),
  };
}
