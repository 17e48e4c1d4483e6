import type { Terminal } from '../models/terminal.ts';
import type { Services } from '../services/services.ts';

/** Ends a terminal at once: its token opens nothing any more. */
export const revokeTerminal = ({ sequelize, now }: Services, terminal: Terminal): Promise<Terminal> =>
  sequelize.transaction(() => terminal.update({ revokedAt: terminal.revokedAt ?? now() }));
