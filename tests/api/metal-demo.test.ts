import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { readReconciliation } from '#server/queries/read-reconciliation.ts';
import { serveStudio, type ServedStudio } from '#tests/support/served-studio.ts';
import { createTestDatabase, type TestDatabase } from '#tests/support/test-database.ts';

let database: TestDatabase;
let studio: ServedStudio;
beforeAll(async () => {
  database = await createTestDatabase();
  studio = await serveStudio(database);
});
afterAll(async () => {
  await studio.close();
  await database.drop();
});

describe('the metal of the demo studio', () => {
  it('went through its past melts by lot, with no departure for it, and each left a button', async () => {
    const { models } = studio.services;
    const melts = await models.Melt.findAll();
    expect(melts.length).toBeGreaterThan(3);
    for (const { id, state } of melts) {
      expect(state.lots?.map(({ kind }) => kind)).toEqual(['returns', 'grain']);
      expect(state.departures.map(({ kind }) => kind)).not.toContain('composition-off');
      expect(await models.Crucible.findByPk(id)).toMatchObject({ balanceMg: 0, contentsMg: {} });
      const [button] = await models.Lot.findAll({ where: { meltId: id } });
      expect(button?.balanceMg).toBe(Math.round((state.closing?.buttonMassG ?? 0) * 1000));
    }
  });

  it('reconciles month by month', async () => {
    const { services } = studio;
    const at = (monthsOn: number): string => {
      const now = services.now();
      return new Date(Date.UTC(now.getUTCFullYear(), now.getUTCMonth() + monthsOn, 15))
        .toISOString()
        .slice(0, 7);
    };
    const lots = await services.models.Lot.findAll();
    const { total } = await readReconciliation(services, at(1));
    expect(total.opening).toBe(lots.reduce((sum, { balanceMg }) => sum + balanceMg, 0));
    expect(total.crucibleOpening).toBe(0);
  });
});
