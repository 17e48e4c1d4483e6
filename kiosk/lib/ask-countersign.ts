import type { Countersigned } from '#shared/domain/instruction/instruction-step.ts';
import { countersignMelt } from '#src/api/cards.ts';

/** Whose sign is asked, on which melt, with the PIN they typed. */
export interface AskedSign {
  readonly meltId: string;
  readonly personId: string;
  readonly pin: string;
}

/** Verifies a second person's PIN and takes their sign; rejects with a ProblemError or an UnreachableError. */
export const askCountersign = ({ meltId, personId, pin }: AskedSign): Promise<Countersigned> =>
  countersignMelt(meltId, { personId, pin });
