import { readdirSync, readFileSync, readlinkSync, rmSync } from 'node:fs';
import { setTimeout as delay } from 'node:timers/promises';

/**
 * Waits until whoever started it is gone or closes the pipe, then ends every process that works in the given
 * folders or has its DATA_DIR there, and removes the folders. Even a killed test run leaves nothing behind.
 */
const folders = process.argv.slice(2);

const isInside = (path) => folders.some((folder) => path === folder || path.startsWith(`${folder}/`));

const workFolder = (pid) => {
  try {
    return readlinkSync(`/proc/${pid}/cwd`);
  } catch {
    return '';
  }
};

const dataFolder = (pid) => {
  try {
    const entries = readFileSync(`/proc/${pid}/environ`, 'utf8').split('\0');
    return entries.find((entry) => entry.startsWith('DATA_DIR='))?.slice('DATA_DIR='.length) ?? '';
  } catch {
    return '';
  }
};

const processesWhere = (folderOf) =>
  readdirSync('/proc').filter((entry) => /^\d+$/.test(entry) && isInside(folderOf(entry)));

const signal = (pids, name) => {
  for (const pid of pids) {
    try {
      process.kill(Number(pid), name);
    } catch {
      // It ended by itself meanwhile.
    }
  }
};

// A start that was under way when the run was killed may bring one more process: look until there is none.
const endProcesses = async () => {
  for (let look = 0; look < 100; look += 1) {
    const servers = processesWhere(dataFolder);
    const databases = processesWhere(workFolder);
    if (servers.length + databases.length === 0) return;
    signal(servers, 'SIGKILL');
    // PostgreSQL's immediate shutdown; killed outright it would leave shared memory behind.
    signal(databases, look < 50 ? 'SIGQUIT' : 'SIGKILL');
    await delay(100);
  }
};

process.stdin.resume();
process.stdin.once('close', async () => {
  await endProcesses();
  for (const folder of folders) rmSync(folder, { recursive: true, force: true, maxRetries: 5 });
});
