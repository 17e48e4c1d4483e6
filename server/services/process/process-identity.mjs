import { readFileSync } from 'node:fs';

/** Reads a process's state letter and start time from the kernel, or null when there is no such process. */
const readStat = (pid) => {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    // The command name may hold spaces and brackets, so the fields are counted from its last bracket.
    const fields = stat.slice(stat.lastIndexOf(')') + 2).split(' ');
    return { state: fields[0], startedAt: fields[19] };
  } catch {
    return null;
  }
};

const hasProc = readStat(process.pid) !== null;

const answersSignal = (pid) => {
  try {
    process.kill(pid, 0);
    return true;
  } catch (error) {
    return error.code === 'EPERM';
  }
};

/** Names one process for ever: its number and, where the kernel tells, its start time, as "pid:ticks". */
export const processIdentity = (pid = process.pid) => `${pid}:${readStat(pid)?.startedAt ?? ''}`;

/** Tells whether the process a `processIdentity` names still runs; a zombie or a reused number does not count. */
export const isProcessAlive = (identity) => {
  const [pid, startedAt] = identity.split(':');
  if (!/^\d+$/.test(pid ?? '')) return false;
  if (!hasProc) return answersSignal(Number(pid));
  const stat = readStat(pid);
  return stat !== null && stat.state !== 'Z' && (!startedAt || stat.startedAt === startedAt);
};
