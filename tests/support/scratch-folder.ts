import { chmodSync, mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { startSweeper } from './sweeper.ts';

/** A temporary folder that goes, with every server that works in it, when `sweep` is called or the run dies. */
export interface ScratchFolder {
  readonly path: string;
  readonly sweep: () => Promise<void>;
}

/** Makes a temporary folder that the database's own user may pass through. */
export const makePassableFolder = (): string => {
  const path = mkdtempSync(join(tmpdir(), 'ladlemark-test-'));
  chmodSync(path, 0o711);
  return path;
};

/** Makes one that is swept. */
export const makeScratchFolder = (): ScratchFolder => {
  const path = makePassableFolder();
  return { path, sweep: startSweeper([path]) };
};
