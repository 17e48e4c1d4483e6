import { randomUUID } from 'node:crypto';
import { buildCasting } from '#tests/factories/build-casting.ts';
import { buildInstrument } from '#tests/factories/build-instrument.ts';
import { buildMelt } from '#tests/factories/build-melt.ts';
import type { RequestTarget } from './request-targets.ts';
import type { Client, TestServer } from './test-server.ts';

/** For every route of instruments that reads a body: somewhere to send one. */
export const buildInstrumentTargets = async (
  server: TestServer,
  owner: Client,
): Promise<Readonly<Record<string, RequestTarget>>> => {
  const { services } = server;
  const { instrument, token } = await buildInstrument(services);
  const logger = server.nobody().set('Authorization', `Bearer ${token}`);
  const casting = await buildCasting(services);
  const melt = await buildMelt(services, { step: 'charge' });
  const at = (path: string, good: object, client = owner): RequestTarget => ({ path, client, good });
  return {
    'post /api/instruments': at('/api/instruments', {
      name: 'Pyrometer',
      kind: 'thermometer',
      thermocouple: 'S',
      terminalId: null,
    }),
    'post /api/instruments/:id/checks': at(`/api/instruments/${instrument.id}/checks`, {
      key: randomUUID(),
      point: 'silver',
      readC: 958,
      wanderC: 0.5,
      note: '',
    }),
    'post /api/instrument-readings': at(
      '/api/instrument-readings',
      { key: randomUUID(), readings: [{ temperatureC: 900, sequence: 1 }] },
      logger,
    ),
    'post /api/flask-cooling': at('/api/flask-cooling', {
      key: randomUUID(),
      castingId: casting.id,
      readings: [{ secondsOut: 10, temperatureC: 480 }],
    }),
    'post /api/melts/:id/cooling-curves': at(`/api/melts/${melt.id}/cooling-curves`, {
      key: randomUUID(),
      table: 'time;temperature\n0;960\n1;959',
      note: '',
    }),
  };
};
