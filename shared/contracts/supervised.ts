/** A step that an apprentice did under supervision: something on a melt that a second person signed for. */
export interface SupervisedStep {
  readonly meltId: string;
  readonly meltCode: string;
  /** When it was signed, ISO 8601. */
  readonly at: string;
  /** A step of the instruction that asks for a sign, or a departure whose reason was signed. */
  readonly kind: 'step' | 'variance';
  /** The step's sentence as the card had it, or the departure's. */
  readonly sentence: string;
  /** What was said of a departure; empty for a step. */
  readonly words: string;
  readonly signedBy: string;
  /** Whether the terminal alone could check the PIN. */
  readonly onDevice: boolean;
}
