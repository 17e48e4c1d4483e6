import { createInstrument } from '#server/commands/create-instrument.ts';
import type { Instrument } from '#server/models/instrument.ts';
import type { Services } from '#server/services/services.ts';
import { buildUser } from './build-user.ts';
import { nextNumber } from './sequence.ts';

/** An instrument and the token its logger holds. */
export interface BuiltInstrument {
  readonly instrument: Instrument;
  readonly token: string;
}

/** Builds an instrument by the command the desk uses; a thermometer of type K unless told otherwise. */
export const buildInstrument = async (
  services: Services,
  overrides: Partial<Parameters<typeof createInstrument>[2]> = {},
): Promise<BuiltInstrument> =>
  createInstrument(
    services,
    { person: await buildUser(services, { roles: ['owner'] }), terminal: null, via: 'desk' },
    {
      name: `Instrument ${nextNumber()}`,
      kind: 'thermometer',
      thermocouple: 'K',
      terminalId: null,
      ...overrides,
    },
  );
