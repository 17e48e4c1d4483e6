import { notFound } from '../errors.ts';
import type { Terminal } from '../models/terminal.ts';
import type { Services } from '../services/services.ts';

/** One terminal. */
export const loadTerminal = async ({ models }: Services, id: string): Promise<Terminal> => {
  const terminal = await models.Terminal.findByPk(id);
  if (!terminal) throw notFound('terminal');
  return terminal;
};

/** Every terminal, the working ones first. */
export const listTerminals = ({ models }: Services): Promise<Terminal[]> =>
  models.Terminal.findAll({
    order: [
      ['revokedAt', 'DESC'],
      ['name', 'ASC'],
    ],
  });
