/** Where files are kept. Keys look like "photos/<id>/full.jpg". */
export interface Storage {
  /** Keeps bytes for good before it returns; an existing key is replaced. */
  readonly put: (key: string, bytes: Buffer) => Promise<void>;
  /** Null when there is nothing under the key. */
  readonly get: (key: string) => Promise<Buffer | null>;
  readonly remove: (key: string) => Promise<void>;
}

/** True for keys that we make: small words, numbers and one ending. Nothing that could leave the folder. */
export const isStorageKey = (key: string): boolean => /^[a-z0-9-]+(\/[a-z0-9-]+)*\.[a-z0-9]+$/.test(key);
