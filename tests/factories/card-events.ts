import type { CardEvent } from '#shared/domain/pour-card/card-event.ts';
import type { CardContext } from '#shared/domain/pour-card/card-state.ts';
import { stepsBefore } from '#shared/domain/instruction/step-applies.ts';
import { guardOnly } from './build-studio.ts';
import { cardSteps, type CardStep } from '#shared/domain/pour-card/card-step.ts';

/** A step a built card can be led to. */
export type ReachableStep = CardStep | 'done';

type Planned = Pick<CardContext, 'figures' | 'plannedMetalG' | 'rules'>;

/** The guard with every caution confirmed that a built studio's cards have. */
export const guarded = {
  type: 'guard-confirmed',
  prompts: guardOnly.steps.map(({ key }) => key),
} as const satisfies CardEvent;

/** What is read and touched before a part of the card, as the card itself has it. */
export const checksBefore = (part: CardStep, { rules }: Pick<CardContext, 'rules'>): readonly CardEvent[] => {
  const keys = stepsBefore(rules?.steps ?? [], part, 'caster').map(({ key }) => key);
  if (part === 'guard') return [{ type: 'guard-confirmed', prompts: keys }];
  return keys.length > 0 ? [{ type: 'checked', keys }] : [];
};

const eventsOf = (step: CardStep, { figures, plannedMetalG }: Planned): readonly CardEvent[] => {
  switch (step) {
    case 'guard':
      return [];
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
export const eventsTo = (step: ReachableStep, context: Planned): readonly CardEvent[] => {
  const passed = step === 'done' ? cardSteps : cardSteps.slice(0, cardSteps.indexOf(step));
  return passed.flatMap((each) => [...checksBefore(each, context), ...eventsOf(each, context)]);
};
