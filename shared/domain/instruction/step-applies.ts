import type { AlloyFamily } from '../alloy/alloy-family.ts';
import type { CastingMethod } from '../casting/casting-method.ts';
import type { CardStep } from '../pour-card/card-step.ts';
import type { Hazard, InstructionStep, WorkerRole } from './instruction-step.ts';

/** What a card is about, as far as conditions ask. */
export interface Work {
  readonly method: CastingMethod;
  readonly family: AlloyFamily;
  readonly hazards: readonly Hazard[];
}

const holds = <Value>(wanted: readonly Value[], ...found: readonly Value[]): boolean =>
  wanted.length === 0 || found.some((value) => wanted.includes(value));

/** Whether a step belongs on a card for this work, whoever does it. */
export const belongsToWork = ({ when }: InstructionStep, { method, family, hazards }: Work): boolean =>
  holds(when.methods, method) && holds(when.families, family) && holds(when.hazards, ...hazards);

/** The steps before one part of the card that are asked of a caster or an apprentice, in order. */
export const stepsBefore = (
  steps: readonly InstructionStep[],
  part: CardStep,
  role: WorkerRole,
): readonly InstructionStep[] =>
  steps.filter(({ before, when }) => before === part && holds(when.roles, role));

const hazardElements: Readonly<Record<string, Hazard>> = { Ni: 'nickel', Pd: 'palladium', Zn: 'zinc' };

/** The hazards of an alloy by what it holds, wt%. */
export const hazardsOf = (compositionWt: Readonly<Record<string, number>>): readonly Hazard[] =>
  Object.entries(compositionWt).flatMap(([element, wt]) => {
    const hazard = hazardElements[element];
    return hazard && wt > 0 ? [hazard] : [];
  });
