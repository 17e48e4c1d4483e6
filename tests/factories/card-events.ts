import type { CardEvent } from '#shared/domain/pour-card/card-event.ts';
import type { CardContext } from '#shared/domain/pour-card/card-state.ts';
import { cardSteps, type CardStep } from '#shared/domain/pour-card/card-step.ts';

/** A step a built card can be led to. */
export type ReachableStep = CardStep | 'done';

const eventsOf = (
  step: CardStep,
  { figures, plannedMetalG }: Pick<CardContext, 'figures' | 'plannedMetalG'>,
): readonly CardEvent[] => {
  switch (step) {
    case 'guard':
      return [{ type: 'guard-confirmed', prompts: ['face', 'hands'] }];
    case 'charge':
      return [{ type: 'charge-weighed', kind: 'grain', massG: plannedMetalG }, { type: 'charge-closed' }];
    case 'melt':
      return [
        { type: 'reading-taken', temperatureC: figures.pourC.target, confirmed: false },
        { type: 'melt-ready' },
      ];
    case 'flask-out':
      return [{ type: 'flask-out', furnaceC: null }];
    case 'pour':
      return [{ type: 'poured' }];
    case 'quench':
      return [{ type: 'quenched' }];
    case 'close':
      return [{ type: 'closed', buttonMassG: 10, lossMassG: 0.1, look: 'full', note: '' }];
  }
};

/** The events that lead a freshly opened card to a step, all as the card plans them. */
export const eventsTo = (
  step: ReachableStep,
  context: Pick<CardContext, 'figures' | 'plannedMetalG'>,
): readonly CardEvent[] => {
  const passed = step === 'done' ? cardSteps : cardSteps.slice(0, cardSteps.indexOf(step));
  return passed.flatMap((each) => eventsOf(each, context));
};
