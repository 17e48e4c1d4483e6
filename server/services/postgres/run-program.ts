import { spawn } from 'node:child_process';

/** The user a database program runs as when we are root, which PostgreSQL refuses. */
export interface ServerUser {
  readonly name: string;
  readonly uid: number;
  readonly gid: number;
}

/** A bare surrounding: PGDATA and its kin would point the programs elsewhere, and messages stay in English. */
const plainEnvironment = { PATH: '/usr/local/bin:/usr/bin:/bin', LC_ALL: 'C' };

const identity = (user: ServerUser | null): { uid?: number; gid?: number } =>
  user === null ? {} : { uid: user.uid, gid: user.gid };

/** Runs a program that ends by itself and gives its output, both streams together; rejects on failure. */
export const readOutput = (
  program: string,
  args: readonly string[],
  user: ServerUser | null = null,
): Promise<string> =>
  new Promise((resolve, reject) => {
    const child = spawn(program, args, { ...identity(user), cwd: '/', env: plainEnvironment });
    const chunks: Buffer[] = [];
    child.stdout.on('data', (chunk: Buffer) => chunks.push(chunk));
    child.stderr.on('data', (chunk: Buffer) => chunks.push(chunk));
    child.once('error', reject);
    child.once('close', (code) => {
      const text = Buffer.concat(chunks).toString();
      if (code === 0) resolve(text);
      else reject(new Error(`${program} failed:\n${text.trim()}`));
    });
  });

/** Runs a program that may leave a server behind and gives its exit code; no pipes, for the server would hold them. */
export const runQuietly = (
  program: string,
  args: readonly string[],
  user: ServerUser | null,
): Promise<number | null> =>
  new Promise((resolve, reject) => {
    const child = spawn(program, args, {
      ...identity(user),
      cwd: '/',
      env: plainEnvironment,
      stdio: 'ignore',
    });
    child.once('error', reject);
    child.once('exit', resolve);
  });
