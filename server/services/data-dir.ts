import { chmodSync, mkdirSync } from 'node:fs';
import { StartProblem } from './start-problem.ts';

/** Others may pass through to what is theirs, but not look around. */
const PASSABLE = 0o711;

/**
 * Makes the folder of DATA_DIR when it is missing. Made by root, it lets the database's own user pass.
 * @throws {StartProblem} when this user may not make it.
 */
export const ensureDataDir = (dataDir: string): void => {
  try {
    if (mkdirSync(dataDir, { recursive: true }) && process.getuid?.() === 0) chmodSync(dataDir, PASSABLE);
  } catch (error) {
    const { code } = error as NodeJS.ErrnoException;
    throw new StartProblem(
      `The folder ${dataDir} cannot be made (${code}); set DATA_DIR to a folder you may write to.`,
    );
  }
};
