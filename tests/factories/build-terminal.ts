import { randomBytes } from 'node:crypto';
import type { CreationAttributes } from 'sequelize';
import type { Terminal } from '#server/models/terminal.ts';
import { hashToken } from '#server/services/hashing.ts';
import type { Services } from '#server/services/services.ts';
import { nextNumber } from './sequence.ts';

/** An enrolled terminal and the token its device holds. */
export interface BuiltTerminal {
  readonly terminal: Terminal;
  readonly token: string;
}

/** Builds an enrolled terminal. */
export const buildTerminal = async (
  { models }: Services,
  overrides: Partial<CreationAttributes<Terminal>> = {},
): Promise<BuiltTerminal> => {
  const token = randomBytes(32).toString('base64url');
  const terminal = await models.Terminal.create({
    name: `Terminal ${nextNumber()}`,
    bay: 'furnace bay 1',
    tokenHash: hashToken(token),
    ...overrides,
  });
  return { terminal, token };
};
