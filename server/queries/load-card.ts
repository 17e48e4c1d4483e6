import type { CardContext } from '#shared/domain/pour-card/card-state.ts';
import type { WorkInstructionRevision } from '../models/work-instruction-revision.ts';
import type { Services } from '../services/services.ts';
import { cardContextOf } from './card-context.ts';
import type { LoadedCasting } from './load-casting.ts';
import { loadChargePlan, type LoadedChargePlan } from './load-charge-plan.ts';
import { loadCoolingFit } from './load-flask-cooling.ts';
import { loadInstruction } from './load-instruction.ts';
import { loadMelt, type ListedMelt, type LoadedEvent } from './load-melt.ts';
import { loadStudio } from './load-studio.ts';

/** A pour card with everything a terminal shows. */
export interface LoadedCard {
  readonly casting: LoadedCasting;
  readonly context: CardContext;
  readonly instruction: WorkInstructionRevision;
  readonly melt: ListedMelt | null;
  readonly events: readonly LoadedEvent[];
  readonly chargePlan: LoadedChargePlan | null;
}

/** Loads a casting's card: a running one keeps the context and instruction it began with, a new one has today's. */
export const loadCard = async (services: Services, casting: LoadedCasting): Promise<LoadedCard> => {
  const chargePlan = await loadChargePlan(services, casting.id);
  const running = casting.melt !== null && (casting.melt.overAt === null || casting.state !== 'holding');
  if (casting.melt && running) {
    const melt = await loadMelt(services, casting.melt.id);
    const { context, workInstructionRevision, events } = melt;
    return { casting, context, instruction: workInstructionRevision, melt, events, chargePlan };
  }
  const [studio, instruction, coolingFit] = await Promise.all([
    loadStudio(services),
    loadInstruction(services),
    loadCoolingFit(services, casting.flask.diameterMm),
  ]);
  return {
    casting,
    context: cardContextOf(casting, studio, { instruction, coolingFit }),
    instruction,
    melt: null,
    events: [],
    chargePlan,
  };
};
