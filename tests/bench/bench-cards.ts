import { randomUUID } from 'node:crypto';
import request from 'supertest';
import { demoEnrolmentCode, demoPeople } from '#server/services/demo-studio/people.ts';
import { buildFlaskCode } from '#shared/lib/codes.ts';
import { startTestCluster } from '../support/test-cluster.ts';
import { serveStudio } from '../support/served-studio.ts';
import { cloneTemplate } from '../support/template-database.ts';
import { guarded } from '#tests/factories/card-events.ts';

const rounds = 200;

const percentile = (sorted: readonly number[], share: number): number =>
  sorted[Math.min(sorted.length - 1, Math.floor(sorted.length * share))] ?? Number.NaN;

const time = async (work: () => Promise<unknown>): Promise<number[]> => {
  const taken: number[] = [];
  for (let round = 0; round < rounds; round += 1) {
    const from = performance.now();
    await work();
    taken.push(performance.now() - from);
  }
  return taken.sort((a, b) => a - b);
};

/** Time to find a pour card by its code and to write a reading, over HTTP on a real PostgreSQL, ms. */
export const benchCards = async (): Promise<Record<string, number>> => {
  const cluster = await startTestCluster(() => {});
  const database = await cloneTemplate(cluster.url);
  const studio = await serveStudio(database);
  try {
    const agent = request.agent(studio.origin).set('Ladlemark-Place', 'terminal');
    await agent.post('/api/terminals').send({ code: demoEnrolmentCode }).expect(201);
    const people = (await agent.get('/api/terminal/people').expect(200)).body as {
      id: string;
      name: string;
    }[];
    const [owner] = demoPeople;
    const personId = people.find(({ name }) => name === owner.name)?.id;
    await agent.post('/api/session/terminal').send({ personId, pin: owner.pin }).expect(200);
    const find = () =>
      agent
        .get('/api/cards')
        .query({ code: buildFlaskCode(147) })
        .expect(200);
    const finds = await time(find);
    const stamp = () => ({ key: randomUUID(), occurredAt: new Date().toISOString() });
    const { casting, context } = (await find()).body as {
      casting: { id: string };
      context: { plannedMetalG: number; figures: { pourC: { target: number } } };
    };
    const opened = await agent.post(`/api/cards/${casting.id}/open`).send(stamp()).expect(200);
    const { melt } = opened.body as { melt: { id: string } };
    const record = (event: object) =>
      agent
        .post(`/api/melts/${melt.id}/events`)
        .send({ ...stamp(), event })
        .expect(201);
    await record(guarded);
    await record({ type: 'charge-weighed', kind: 'grain', massG: context.plannedMetalG });
    await record({ type: 'charge-closed' });
    const temperatureC = context.figures.pourC.target;
    const writes = await time(() => record({ type: 'reading-taken', temperatureC }));
    return {
      'card.findP50Ms': percentile(finds, 0.5),
      'card.findP95Ms': percentile(finds, 0.95),
      'write.readingP50Ms': percentile(writes, 0.5),
      'write.readingP95Ms': percentile(writes, 0.95),
    };
  } finally {
    await studio.close();
    await database.drop();
    await cluster.stop();
  }
};
