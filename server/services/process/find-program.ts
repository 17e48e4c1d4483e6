import { accessSync, constants } from 'node:fs';
import { delimiter, join } from 'node:path';

/** Tells whether this user may run the file. */
export const isProgram = (path: string): boolean => {
  try {
    accessSync(path, constants.X_OK);
    return true;
  } catch {
    return false;
  }
};

/** The path of the first of these programs that is found, looking in /usr/bin before the PATH; null when none is. */
export const findProgram = (names: readonly string[], path = process.env['PATH'] ?? ''): string | null => {
  const folders = ['/usr/bin', ...path.split(delimiter).filter((entry) => entry.startsWith('/'))];
  const candidates = names.flatMap((name) => folders.map((folder) => join(folder, name)));
  return candidates.find(isProgram) ?? null;
};
