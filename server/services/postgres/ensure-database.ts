import type pg from 'pg';
import { connectWhenReady } from './connect-when-ready.ts';

/** Replaying what a killed server had not yet written out takes seconds, rarely minutes. */
const RECOVERY_MS = 300_000;

/** What the product's own database needs: a role without a superuser's rights, and a database that it owns. */
export interface DatabaseWanted {
  readonly role: string;
  readonly password: string;
  readonly database: string;
  /** Lets the role make databases of its own; only the tests need it. */
  readonly mayCreateDatabases: boolean;
}

const exists = async (client: pg.Client, table: string, column: string, name: string): Promise<boolean> =>
  (await client.query(`SELECT 1 FROM ${table} WHERE ${column} = $1`, [name])).rowCount === 1;

/** Makes the role and the database when they are missing, as the superuser whose address is given. */
export const ensureDatabase = async (keeperUrl: string, wanted: DatabaseWanted): Promise<void> => {
  const client = await connectWhenReady(keeperUrl, RECOVERY_MS);
  try {
    const role = client.escapeIdentifier(wanted.role);
    if (!(await exists(client, 'pg_roles', 'rolname', wanted.role))) {
      const rights = wanted.mayCreateDatabases ? 'LOGIN CREATEDB' : 'LOGIN';
      await client.query(`CREATE ROLE ${role} ${rights} PASSWORD ${client.escapeLiteral(wanted.password)}`);
    }
    if (!(await exists(client, 'pg_database', 'datname', wanted.database))) {
      await client.query(`CREATE DATABASE ${client.escapeIdentifier(wanted.database)} OWNER ${role}`);
    }
  } finally {
    await client.end();
  }
};
