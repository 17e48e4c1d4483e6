import { spawn } from 'node:child_process';
import { chmodSync, existsSync, mkdirSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import pg from 'pg';
import { afterAll, afterEach, beforeAll, describe, expect, it, onTestFinished } from 'vitest';
import { type ClusterHome, findClusterHome } from '#server/services/postgres/cluster-home.ts';
import { findPostgres, type PostgresBinaries } from '#server/services/postgres/postgres-binaries.ts';
import { findPostmaster } from '#server/services/postgres/postmaster.ts';
import { type PrivateCluster, startPrivateCluster } from '#server/services/postgres/private-cluster.ts';
import { StartProblem } from '#server/services/start-problem.ts';
import { makeScratchFolder } from '#tests/support/scratch-folder.ts';
import { waitFor } from '#tests/support/wait-for.ts';

const scratch = makeScratchFolder();
afterAll(scratch.sweep);

const dataDir = join(scratch.path, 'studio');
const home = join(dataDir, 'postgres');
const pgdata = join(home, 'current', 'pgdata');
const pidFile = join(pgdata, 'postmaster.pid');

let installed: readonly PostgresBinaries[] = [];
let clusterHome: ClusterHome = { path: home, user: null };
beforeAll(async () => {
  installed = await findPostgres();
  clusterHome = await findClusterHome(dataDir, () => {});
});

const started: PrivateCluster[] = [];

const start = async (): Promise<PrivateCluster> => {
  const options = { home: clusterHome, installed, durable: true, mayCreateDatabases: false, say: () => {} };
  const cluster = await startPrivateCluster(options);
  started.push(cluster);
  return cluster;
};

// A test that fails half way must not hand its server on to the next; released twice does no harm.
afterEach(() => Promise.all(started.splice(0).map((cluster) => cluster.release())));

const ask = async (url: string, question: string): Promise<string[]> => {
  const client = new pg.Client({ connectionString: url });
  await client.connect();
  try {
    const { rows } = await client.query<Record<string, unknown>>(question);
    return rows.flatMap((row) => Object.values(row).map(String));
  } finally {
    await client.end();
  }
};

/** A process that has ended but that its parent has not fetched: it has a number, and answers signals. */
const makeZombie = async (): Promise<{ pid: number; end: () => void }> => {
  const parent = spawn('/bin/sh', ['-c', 'sleep 0.5 & echo $!; exec sleep 60'], {
    stdio: ['ignore', 'pipe', 'ignore'],
  });
  const pid = await new Promise<number>((resolve) =>
    parent.stdout.once('data', (chunk: Buffer) => resolve(Number(chunk.toString()))),
  );
  await waitFor('a zombie', () => / Z /.test(readFileSync(`/proc/${pid}/stat`, 'utf8')));
  return { pid, end: () => void parent.kill() };
};

/** What a killed server leaves: the number of some process, and the port of a server that is gone. */
const leavePidFile = (pid: number): void => {
  writeFileSync(pidFile, `${pid}\n${pgdata}\n1700000000\n59999\n\n127.0.0.1\n  123456   7\nready   \n`);
  if (clusterHome.user) chmodSync(pidFile, 0o644);
};

describe('the private cluster', () => {
  it('is made afresh where an earlier start was killed half way', async () => {
    mkdirSync(join(home, 'making', 'pgdata'), { recursive: true });
    writeFileSync(join(home, 'making', 'pgdata', 'PG_VERSION'), '15\n');
    const cluster = await start();
    expect(await ask(cluster.url, 'SELECT 1')).toEqual(['1']);
    expect(existsSync(join(home, 'making'))).toBe(false);
    await cluster.release();
  });

  it('is durable, checksummed, on the loopback only, and keeps its password from others', async () => {
    const cluster = await start();
    const settings = ['fsync', 'full_page_writes', 'synchronous_commit', 'data_checksums'];
    for (const setting of settings) expect(await ask(cluster.url, `SHOW ${setting}`)).toEqual(['on']);
    expect(await ask(cluster.url, 'SHOW listen_addresses')).toEqual(['127.0.0.1']);
    // Line 5 of the pid file is the folder of the socket, which would let local users try without a network.
    expect(readFileSync(pidFile, 'utf8').split('\n')[4]).toBe('');
    expect(await ask(cluster.url, 'SHOW server_encoding')).toEqual(['UTF8']);
    expect(await ask(cluster.url, 'SELECT rolsuper FROM pg_roles WHERE rolname = current_user')).toEqual([
      'false',
    ]);
    expect(statSync(join(home, 'current', 'password')).mode & 0o777).toBe(0o600);
    expect(statSync(pgdata).mode & 0o777).toBe(0o700);
    const stranger = Object.assign(new URL(cluster.url), { password: '' }).href;
    await expect(ask(stranger, 'SELECT 1')).rejects.toThrow();
    await cluster.release();
  });

  it.each(['no process', 'a stranger', 'a zombie'])('starts over a pid file that names %s', async (kind) => {
    const zombie = kind === 'a zombie' ? await makeZombie() : null;
    leavePidFile(zombie?.pid ?? (kind === 'a stranger' ? process.pid : 4_194_304));
    expect(findPostmaster(pgdata)).toBeNull();
    const cluster = await start();
    expect(await ask(cluster.url, 'SELECT 1')).toEqual(['1']);
    await cluster.release();
    zombie?.end();
    expect(existsSync(pidFile)).toBe(false);
  });

  it('comes back on the same port after kill -9 with all that was acknowledged', async () => {
    const cluster = await start();
    await ask(cluster.url, 'CREATE TABLE melted (grams int)');
    await ask(cluster.url, 'INSERT INTO melted VALUES (250)');
    const killed = findPostmaster(pgdata);
    process.kill(killed?.pid ?? 0, 'SIGKILL');
    const back = await waitFor('the server to be back', () => {
      const now = findPostmaster(pgdata);
      return now && now.pid !== killed?.pid ? now : null;
    });
    expect(back.port).toBe(killed?.port);
    const grams = await waitFor('an answer', () =>
      ask(cluster.url, 'SELECT grams FROM melted').catch(() => null),
    );
    expect(grams).toEqual(['250']);
    await cluster.release();
    expect(findPostmaster(pgdata)).toBeNull();
  });

  it('starts after kill -9 when nobody was watching', async () => {
    const cluster = await start();
    const killed = findPostmaster(pgdata)?.pid ?? 0;
    process.kill(killed, 'SIGSTOP');
    process.kill(killed, 'SIGKILL');
    await cluster.release();
    const next = await start();
    expect(await ask(next.url, 'SELECT grams FROM melted')).toEqual(['250']);
    await next.release();
  });

  it('is not replaced when its files are damaged: it says so and touches nothing', async () => {
    const version = join(pgdata, 'PG_VERSION');
    const text = readFileSync(version);
    rmSync(version);
    await expect(start()).rejects.toThrow(StartProblem);
    await expect(start()).rejects.toThrow(/holds no database\. Put it back from a backup/);
    writeFileSync(version, '9\n');
    await expect(start()).rejects.toThrow(/made by PostgreSQL 9, and only .* is installed/);
    writeFileSync(version, text);
    const cluster = await start();
    expect(await ask(cluster.url, 'SELECT grams FROM melted')).toEqual(['250']);
    await cluster.release();
  });
});

describe('the place of the private cluster', () => {
  it('is elsewhere, said and remembered, when the database cannot pass to DATA_DIR', async () => {
    const closed = join(scratch.path, 'closed');
    mkdirSync(closed, { mode: 0o700 });
    const said: string[] = [];
    const first = await findClusterHome(join(closed, 'data'), (line) => said.push(line));
    onTestFinished(() => rmSync(first.path, { recursive: true, force: true }));
    const again = await findClusterHome(join(closed, 'data'), (line) => said.push(line));
    expect(again).toEqual(first);
    // Only root hands the server to another user; anyone else may keep it behind a closed door.
    const isMoved = process.getuid?.() === 0;
    expect(first.path === join(closed, 'data', 'postgres')).toBe(!isMoved);
    expect(said).toHaveLength(isMoved ? 1 : 0);
    expect(statSync(first.path).mode & 0o777).toBe(0o700);
    rmSync(first.path, { recursive: true });
    if (isMoved)
      await expect(findClusterHome(join(closed, 'data'), () => {})).rejects.toThrow(/which is not there/);
  });
});
