import { randomUUID } from 'node:crypto';
import { buildCasting } from '#tests/factories/build-casting.ts';
import { buildLot, quarantineLot, STERLING_GRAIN } from '#tests/factories/build-lot.ts';
import { buildMelt } from '#tests/factories/build-melt.ts';
import { buildUser, PASSWORD } from '#tests/factories/build-user.ts';
import type { RequestTarget } from './request-targets.ts';
import { START, type Client, type TestServer } from './test-server.ts';

/** For every route of lots, ledger and charges that reads a body: somewhere to send one. */
export const buildMetalTargets = async (
  { services }: TestServer,
  owner: Client,
): Promise<Readonly<Record<string, RequestTarget>>> => {
  const lot = await buildLot(services);
  const held = await buildLot(services);
  await quarantineLot(services, held);
  const casting = await buildCasting(services);
  const melt = await buildMelt(services, { step: 'done' });
  const signer = await buildUser(services, { roles: ['caster'] });
  const movement = await services.models.MetalMovement.findOne({
    where: { lotId: lot.id },
    rejectOnEmpty: true,
  });
  const countersign = { login: signer.login, password: PASSWORD };
  const key = randomUUID();
  const at = (path: string, good: object): RequestTarget => ({ path, client: owner, good });
  return {
    'post /api/lots': at('/api/lots', {
      ...STERLING_GRAIN,
      key,
      name: 'Grain',
      kind: 'grain',
      massG: 10,
      receivedAt: START,
    }),
    'post /api/lots/:id/amendments': at(`/api/lots/${lot.id}/amendments`, {
      kind: 'assay',
      ...STERLING_GRAIN,
      reason: 'Assay 7',
    }),
    'post /api/lots/:id/release': at(`/api/lots/${held.id}/release`, { reason: 'Assayed clean.' }),
    'post /api/lots/:id/counts': at(`/api/lots/${lot.id}/counts`, {
      key,
      countedG: 1,
      explanation: 'Why.',
      countersign,
    }),
    'post /api/lots/:id/dispatches': at(`/api/lots/${lot.id}/dispatches`, {
      key,
      massG: 1,
      reason: 'refiner',
    }),
    'post /api/lot-intake/preview': at('/api/lot-intake/preview', {
      text: 'name;kind;mass;unit;Ag\na;grain;1;g;100',
    }),
    'post /api/lot-intake': at('/api/lot-intake', {
      key,
      text: 'name;kind;mass;unit;Ag\na;grain;1;g;100',
      onlyGood: true,
    }),
    'post /api/metal/movements/:id/corrections': at(`/api/metal/movements/${movement.id}/corrections`, {
      key,
      rightMassG: 1,
      reason: 'Typed wrong.',
      countersign,
    }),
    'post /api/charge-plans/proposals': at('/api/charge-plans/proposals', {
      castingIds: [casting.id],
      together: true,
    }),
    'post /api/charge-plans/pot': at('/api/charge-plans/pot', {
      ...STERLING_GRAIN,
      massG: 10,
      alloyRevisionId: casting.alloyRevisionId,
    }),
    'post /api/charge-plans': at('/api/charge-plans', {
      castingIds: [casting.id],
      lines: [{ lotId: lot.id, massG: 100 }],
    }),
    'post /api/melts/:id/close-out': at(`/api/melts/${melt.id}/close-out`, {
      buttonG: 1,
      lossG: 0,
      note: 'Frozen.',
    }),
  };
};
