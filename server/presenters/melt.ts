import type { Melt as MeltContract, MeltSummary } from '#shared/contracts/melt.ts';
import { holdsPieces, openVariances } from '#shared/domain/pour-card/apply-variance.ts';
import { chargedG, type CardState } from '#shared/domain/pour-card/card-state.ts';
import type { Actor } from '../policies/actor.ts';
import { meltPolicy } from '../policies/melt.ts';
import { can } from '../policies/policy.ts';
import type { ListedMelt, LoadedMelt } from '../queries/load-melt.ts';
import { presentMeltEvent } from './card.ts';
import { presentCasting } from './casting.ts';
import { presentPhotograph } from './photograph.ts';

const presentStop = ({ stopped, departures }: CardState): MeltSummary['stop'] => {
  const stop = stopped && departures.findLast(({ kind }) => kind === 'work-stopped');
  return stop ? { sentence: stop.sentence, at: stop.at } : null;
};

/** A melt as a line of the melt book. */
export const presentMeltSummary = (melt: ListedMelt): MeltSummary => {
  const { state, context, alloyRevision, casting } = melt;
  return {
    id: melt.id,
    code: melt.code,
    number: melt.number,
    alloyName: alloyRevision.alloy.name,
    family: alloyRevision.alloy.family,
    fineness: alloyRevision.fineness,
    flaskCode: casting.flask.code,
    step: state.step,
    stopped: state.stopped !== null,
    stop: presentStop(state),
    openedAt: melt.openedAt.toISOString(),
    pouredAt: state.pour?.at ?? null,
    pourMeltC: state.pour?.meltC ?? null,
    metalInG: chargedG(state),
    castMassG: state.closing?.castMassG ?? null,
    lossMassG: state.closing?.lossMassG ?? null,
    person: melt.opener.name,
    terminal: melt.terminal.name,
    departures: state.departures.length,
    openVariances: openVariances(state, context).length,
    holdsPieces: holdsPieces(state),
  };
};

/** One melt with everything that happened on it. */
export const presentMelt = (melt: LoadedMelt, actor: Actor): MeltContract => ({
  ...presentMeltSummary(melt),
  casting: presentCasting(melt.casting, actor),
  compositionWt: melt.alloyRevision.compositionWt,
  rangeBasis: melt.alloyRevision.figures.basis,
  context: melt.context,
  instructionRevision: melt.workInstructionRevision.number,
  steps: melt.context.rules?.steps ?? melt.workInstructionRevision.content.steps,
  state: melt.state,
  events: melt.events.map(presentMeltEvent),
  amendments: melt.amendments.map(({ seq, note, user, createdAt }) => ({
    seq,
    note,
    person: user.name,
    at: createdAt.toISOString(),
  })),
  photographs: melt.photographs.map((photograph) =>
    presentPhotograph({ photograph, person: photograph.user.name }),
  ),
  abilities: { amend: can(meltPolicy.amend, actor, melt) },
});
