import { existsSync, readdirSync } from 'node:fs';
import { createServer } from 'node:net';
import type { AddressInfo } from 'node:net';
import { join } from 'node:path';
import { afterAll, describe, expect, inject, it } from 'vitest';
import { findPostmaster } from '#server/services/postgres/postmaster.ts';
import { makeScratchFolder } from '#tests/support/scratch-folder.ts';
import { startServerProcess } from '#tests/support/started-server.ts';
import { cloneTemplate } from '#tests/support/template-database.ts';
import { waitFor } from '#tests/support/wait-for.ts';

const scratch = makeScratchFolder();
afterAll(scratch.sweep);

/** One studio's data for the whole file: each test leaves it as a person would find it, and the next goes on. */
const dataDir = join(scratch.path, 'studio');
const pgdata = join(dataDir, 'postgres', 'current', 'pgdata');

const health = async (origin: string): Promise<number> =>
  (await fetch(`${origin}/api/health`).catch(() => null))?.status ?? 0;

const postmasterPid = (): number => findPostmaster(pgdata)?.pid ?? 0;

describe('npm start', () => {
  it('makes everything from nothing, greets with addresses and sign-ins, and stops cleanly on SIGTERM', async () => {
    const server = startServerProcess({ DATA_DIR: dataDir });
    const origin = await server.ready;
    expect(await health(origin)).toBe(200);
    expect(server.said()).toMatch(/terminal +http:\/\/localhost:\d+\/kiosk/);
    for (const role of ['owner', 'caster', 'apprentice', 'jeweller']) expect(server.said()).toContain(role);
    expect(postmasterPid()).toBeGreaterThan(0);
    server.signal('SIGTERM');
    expect(await server.ended).toBe(0);
    expect(postmasterPid()).toBe(0);
    expect(existsSync(join(pgdata, 'postmaster.pid'))).toBe(false);
  });

  it('lets two servers share the data, the first to be ready and the last to leave in any order', async () => {
    const one = startServerProcess({ DATA_DIR: dataDir });
    const two = startServerProcess({ DATA_DIR: dataDir });
    const [, second] = await Promise.all([one.ready, two.ready]);
    one.signal('SIGINT');
    expect(await one.ended).toBe(0);
    expect(await health(second)).toBe(200);
    two.signal('SIGINT');
    expect(await two.ended).toBe(0);
    expect(postmasterPid()).toBe(0);
  });

  it('goes on after its own process was killed, with the database that outlived it', async () => {
    const killed = startServerProcess({ DATA_DIR: dataDir });
    await killed.ready;
    killed.signal('SIGKILL');
    expect(await killed.ended).toBe('SIGKILL');
    const survivor = postmasterPid();
    expect(survivor).toBeGreaterThan(0);
    const next = startServerProcess({ DATA_DIR: dataDir });
    expect(await health(await next.ready)).toBe(200);
    expect(postmasterPid()).toBe(survivor);
    next.signal('SIGTERM');
    expect(await next.ended).toBe(0);
    expect(postmasterPid()).toBe(0);
  });

  it('brings a killed database back while it serves', async () => {
    const server = startServerProcess({ DATA_DIR: dataDir });
    const origin = await server.ready;
    const before = postmasterPid();
    process.kill(before, 'SIGKILL');
    await waitFor('another database server', () => ![0, before].includes(postmasterPid()));
    await waitFor('a healthy answer', async () => (await health(origin)) === 200);
    server.signal('SIGTERM');
    expect(await server.ended).toBe(0);
    expect(postmasterPid()).toBe(0);
  });
});

describe.concurrent('npm start, each with data of its own,', () => {
  it('says which port is taken before it begins anything', async () => {
    const unused = join(scratch.path, 'port-taken');
    const squatter = createServer();
    await new Promise<void>((resolve) => squatter.listen(0, '127.0.0.1', resolve));
    const { port } = squatter.address() as AddressInfo;
    const server = startServerProcess({ DATA_DIR: unused, PORT: String(port) });
    expect(await server.ended).toBe(1);
    squatter.close();
    expect(server.said().trim().split('\n')).toEqual([
      `Port ${port} is taken by another program, or Ladlemark runs already. Choose another: PORT=${port + 1} npm start`,
    ]);
    expect(existsSync(unused)).toBe(false);
  });

  it('lists every bad setting in a sentence, with no stack, and begins nothing', async () => {
    const unused = join(scratch.path, 'bad-settings');
    const bad = {
      DATA_DIR: unused,
      PORT: '70000',
      SESSION_SECRET: 'short',
      DATABASE_URL: 'mysql://u:pw@h/d',
    };
    const server = startServerProcess(bad);
    expect(await server.ended).toBe(78);
    const lines = server.said().trim().split('\n');
    expect(lines.map((line) => line.split(' ')[0])).toEqual(['PORT', 'DATABASE_URL', 'SESSION_SECRET']);
    expect(existsSync(unused)).toBe(false);
  });

  it('uses the database of DATABASE_URL and makes none of its own', async () => {
    const database = await cloneTemplate(inject('postgresUrl'), { template: false });
    const ownDir = join(scratch.path, 'own-database');
    const server = startServerProcess({ DATA_DIR: ownDir, DATABASE_URL: database.url });
    expect(await health(await server.ready)).toBe(200);
    server.signal('SIGTERM');
    expect(await server.ended).toBe(0);
    expect(readdirSync(ownDir)).not.toContain('postgres');
    await database.drop();
  });

  it('says what is wrong with DATABASE_URL without repeating its password', async () => {
    const address = new URL(inject('postgresUrl'));
    address.password = 'not-the-password';
    const server = startServerProcess({ DATA_DIR: join(scratch.path, 'wrong'), DATABASE_URL: address.href });
    expect(await server.ended).toBe(1);
    expect(server.said().trim()).toBe(
      'The database named by DATABASE_URL cannot be used: the user or the password is wrong.',
    );
  });

  it('stops on a signal in the middle of the start, and leaves no database server behind', async () => {
    const early = join(scratch.path, 'early');
    const server = startServerProcess({ DATA_DIR: early });
    await waitFor('the first step', () => server.said().includes('Making the database'));
    server.signal('SIGTERM');
    expect(await server.ended).toBe(0);
    expect(server.said()).not.toContain('ready');
    expect(findPostmaster(join(early, 'postgres', 'current', 'pgdata'))).toBeNull();
  });
});
