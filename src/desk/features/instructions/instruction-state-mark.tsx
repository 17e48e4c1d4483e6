import type { InstructionSummary } from '#shared/contracts/instruction.ts';
import { StateMark } from '#src/ui/state-mark.tsx';

/** Where a revision of the work instruction stands, as a shape and in words. */
export const InstructionStateMark = ({
  revision: { status, isInForce },
}: {
  readonly revision: Pick<InstructionSummary, 'status' | 'isInForce'>;
}) => {
  if (isInForce) return <StateMark state="ready" text="in force" size="row" />;
  const words = { draft: 'draft', approved: 'superseded', dropped: 'dropped' }[status];
  return <StateMark state="wait" text={words} size="row" />;
};
