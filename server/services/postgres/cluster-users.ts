import { mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { isProcessAlive, processIdentity } from '#server/services/process/process-identity.mjs';
import type { ClusterHome } from './cluster-home.ts';

const folderOf = (home: ClusterHome): string => join(home.path, 'in-use');

const ownFile = (home: ClusterHome): string => join(folderOf(home), String(process.pid));

/** Notes that this process uses the cluster, so that another one does not stop it meanwhile. */
export const joinCluster = (home: ClusterHome): void => {
  mkdirSync(folderOf(home), { recursive: true });
  writeFileSync(ownFile(home), processIdentity());
};

/** Takes our note away, and those of processes that were killed; true when nobody is left. */
export const leaveCluster = (home: ClusterHome): boolean => {
  rmSync(ownFile(home), { force: true });
  const notes = readdirSync(folderOf(home)).map((name) => join(folderOf(home), name));
  const dead = notes.filter((note) => !isProcessAlive(readFileSync(note, 'utf8')));
  for (const note of dead) rmSync(note, { force: true });
  return dead.length === notes.length;
};
