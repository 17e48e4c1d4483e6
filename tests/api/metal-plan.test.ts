import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import type { PourCard } from '#shared/contracts/card.ts';
import type { ChargeOutcome, ChargeProposal, RunningCharge } from '#shared/contracts/charge.ts';
import type { AlloyRevision } from '#server/models/alloy-revision.ts';
import type { Lot } from '#server/models/lot.ts';
import { buildAlloyRevision } from '#tests/factories/build-alloy-revision.ts';
import { buildCasting } from '#tests/factories/build-casting.ts';
import { buildLot } from '#tests/factories/build-lot.ts';
import { chargeOf, meltAtCharge } from '#tests/support/charge-by-lot.ts';
import { deliverEvent } from '#tests/support/deliver-event.ts';
import { problemIdOf, sentenceOf } from '#tests/support/problem-id.ts';
import {
  startTestServer,
  type SignedInClient,
  type TerminalClient,
  type TestServer,
} from '#tests/support/test-server.ts';

let server: TestServer;
let owner: SignedInClient;
let here: TerminalClient;
let sterling: AlloyRevision;
beforeAll(async () => {
  server = await startTestServer();
  owner = await server.deskAs('owner');
  here = await server.terminalAs('caster');
  sterling = await buildAlloyRevision(server.services, { toleranceWt: { Ag: 0.3, Cu: 0.3 } });
});
afterEach(() => server.expectNoSurprises());
afterAll(() => server.close());

const castingOfSterling = () => buildCasting(server.services, { alloyRevisionId: sterling.id });

describe('planning a charge', () => {
  /** Lots of other tests must not help. */
  const aloneIn = async (build: () => Promise<unknown>): Promise<TestServer> => {
    await server.services.sequelize.query(
      `insert into lot_amendments (lot_id, kind, reason, user_id)
       select id, 'quarantined', 'another test', received_by from lots where quarantine_reason is null`,
    );
    await build();
    return server;
  };
  const propose = async (body: object): Promise<readonly ChargeProposal[]> =>
    (await owner.client.post('/api/charge-plans/proposals').send(body).expect(200)).body as ChargeProposal[];
  const planned = (outcome: ChargeOutcome | undefined) => {
    if (outcome?.kind !== 'planned') throw new Error(`Nothing was planned: ${JSON.stringify(outcome)}`);
    return outcome;
  };

  it('uses returns up to the limit and the rest of grain, keeps the plan, and puts it on the card', async () => {
    let returns = '';
    await aloneIn(async () => {
      await buildLot(server.services, { massG: 500 });
      returns = (await buildLot(server.services, { kind: 'returns', massG: 300 })).id;
    });
    const casting = await castingOfSterling();
    const [proposal] = await propose({ castingIds: [casting.id] });
    const plan = planned(proposal?.outcome);
    expect(plan.lines.map(({ lotId, massG }) => [lotId === returns, massG]).sort()).toEqual([
      [false, 50],
      [true, 50],
    ]);
    expect([plan.totalG, plan.returnsShare]).toEqual([100, 0.5]);
    expect(plan.worstPpt).toBeGreaterThanOrEqual(925);
    const lines = plan.lines.map(({ lotId, massG }) => ({ lotId, massG }));
    const saved = await owner.client
      .post('/api/charge-plans')
      .send({ castingIds: [casting.id], lines })
      .expect(201);
    expect(saved.body).toMatchObject({ wantedG: 100, worstPpt: plan.worstPpt, person: owner.user.name });
    const card = (await here.client.get(`/api/cards/${casting.id}`).expect(200)).body as PourCard;
    expect(card.chargePlan?.lines.map(({ massG }) => massG)).toEqual([50, 50]);
    const tooMuch = lines.map(({ lotId, massG }) => ({
      lotId,
      massG: lotId === returns ? massG + 10 : massG - 10,
    }));
    const refused = await owner.client
      .post('/api/charge-plans')
      .send({ castingIds: [casting.id], lines: tooMuch });
    expect([problemIdOf(refused), sentenceOf(refused)]).toEqual([
      'charge-refused',
      'There are too many returns.',
    ]);
  });

  it('shares the lots out among the castings of a day, and pours several from one melt', async () => {
    await aloneIn(() => buildLot(server.services, { massG: 250 }));
    const castings = [await castingOfSterling(), await castingOfSterling(), await castingOfSterling()];
    const castingIds = castings.map(({ id }) => id);
    const each = await propose({ castingIds, together: false });
    expect(each.map(({ outcome }) => outcome.kind)).toEqual(['planned', 'planned', 'short']);
    const [one] = await propose({ castingIds: castingIds.slice(0, 2), lossShare: 0.002 });
    expect(one?.wantedG).toBe(200.401);
    expect(planned(one?.outcome).totalG).toBeCloseTo(200.4, 5);
    const other = await buildCasting(server.services);
    const mixed = await owner.client
      .post('/api/charge-plans/proposals')
      .send({ castingIds: [other.id, ...castingIds] });
    expect(problemIdOf(mixed)).toBe('charge-refused');
  });

  it('says what stands in the way and how much of what would do', async () => {
    await aloneIn(() =>
      buildLot(server.services, { compositionWt: { Ag: 92.3, Cu: 7.7 }, toleranceWt: { Ag: 0.05 } }),
    );
    const [proposal] = await propose({ castingIds: [(await castingOfSterling()).id] });
    const { outcome } = proposal ?? {};
    if (outcome?.kind !== 'short') throw new Error('It was planned.');
    expect(outcome.obstacles).toEqual([
      "At the certificates' lower bounds the lots on hand do not reach 925 parts per thousand of silver.",
    ]);
    // 100 (92.5 − 92.25) / (99.985 − 92.25) = 3.232 g, weighed as 3.24 g.
    expect(outcome.wouldDo).toEqual([{ name: 'fine silver', massG: 3.24 }]);
  });

  it('recomputes the remainder for an over-weigh', async () => {
    let returns: Lot | undefined;
    await aloneIn(async () => {
      await buildLot(server.services, { massG: 500 });
      returns = await buildLot(server.services, { kind: 'returns', massG: 300 });
    });
    if (!returns) throw new Error('No returns.');
    const { id: meltId } = await meltAtCharge(server.services, here, (await castingOfSterling()).id);
    await deliverEvent(here.client, meltId, chargeOf(returns, 50.6)).expect(201);
    const running = (await here.client.get(`/api/melts/${meltId}/charge`).expect(200)).body as RunningCharge;
    expect(running).toMatchObject({ totalG: 50.6, wantedG: 100, markPpt: 925 });
    const { lines, totalG, returnsShare } = planned(running.remainder);
    // Half of the charge may be returns, so the whole grows to twice what was weighed.
    expect([lines.map(({ massG }) => massG), totalG, returnsShare]).toEqual([[50.6], 101.2, 0.5]);
  });

  it('says what to add to a pot', async () => {
    await aloneIn(() =>
      buildLot(server.services, {
        kind: 'fine',
        name: 'fine silver',
        compositionWt: { Ag: 99.99 },
        toleranceWt: { Ag: 0.005 },
        massG: 100,
      }),
    );
    const pot = {
      massG: 100,
      compositionWt: { Ag: 90, Cu: 10 },
      toleranceWt: { Ag: 0, Cu: 0 },
      alloyRevisionId: sterling.id,
    };
    const outcome = (await owner.client.post('/api/charge-plans/pot').send(pot).expect(200))
      .body as ChargeOutcome;
    const plan = planned(outcome);
    // 100 (92.5 − 90) / (99.985 − 92.5) = 33.400… g at the certificate's lower bound.
    expect(plan.lines.map(({ massG }) => massG)).toEqual([33.41]);
    expect(plan.worstPpt).toBeGreaterThanOrEqual(925);
  });
});
