import type { CardStep } from '../pour-card/card-step.ts';
import type { InstructionStep } from './instruction-step.ts';

/** A work instruction: the one sentence of each part of the card, the steps that come before them, and what to do when it goes wrong. */
export interface WorkInstruction {
  readonly title: string;
  readonly sentences: Readonly<Record<CardStep, string>>;
  /** In the order in which they are done. */
  readonly steps: readonly InstructionStep[];
  readonly emergencyText: string;
  readonly deference: string;
}
