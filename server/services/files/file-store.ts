import { createHash, randomUUID } from 'node:crypto';
import { createReadStream } from 'node:fs';
import { mkdir, rename, stat, writeFile } from 'node:fs/promises';
import { join } from 'node:path';
import type { Readable } from 'node:stream';

/** Files kept by what is in them. */
export interface FileStore {
  /** Keeps some content and gives its SHA-256, by which it is found again; the same content is kept once. */
  readonly keep: (content: Buffer) => Promise<string>;
  /** Opens the content of a hash; rejects when it is not there. */
  readonly open: (sha256: string) => Promise<Readable>;
}

/** Keeps files below a folder, which is made when the first one comes. */
export const createFileStore = (folder: string): FileStore => {
  const pathOf = (sha256: string): string => join(folder, sha256.slice(0, 2), sha256);
  return {
    keep: async (content) => {
      const sha256 = createHash('sha256').update(content).digest('hex');
      const path = pathOf(sha256);
      await mkdir(join(folder, sha256.slice(0, 2)), { recursive: true, mode: 0o700 });
      // Written beside and moved into place, so that a half-written file never bears a hash.
      const draft = join(folder, `.${randomUUID()}`);
      await writeFile(draft, content, { mode: 0o600, flush: true });
      await rename(draft, path);
      return sha256;
    },
    open: async (sha256) => {
      const path = pathOf(sha256);
      await stat(path);
      return createReadStream(path);
    },
  };
};
