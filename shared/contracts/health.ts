/** Whether the server can do its work; answered with 200 when ready, else 503. */
export interface Health {
  readonly ready: boolean;
  readonly database: 'up' | 'down';
  /** Migrations that have not run; empty when the schema is current. */
  readonly pendingMigrations: readonly string[];
}
