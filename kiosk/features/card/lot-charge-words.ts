import { formatFineness, lotKindNames } from '#shared/domain/metal/lot.ts';
import { metalName } from '#shared/domain/metal/metal-name.ts';
import type { ChargeAdvice } from '#shared/domain/pour-card/advise-charge.ts';
import type { CardContext, CardState } from '#shared/domain/pour-card/card-state.ts';
import { correctedFromG, type ChargeLineState } from '#shared/domain/pour-card/charge-lines.ts';
import { judgeCharge } from '#shared/domain/pour-card/judge-charge.ts';
import { judgeMetal, type MetalVerdict } from '#shared/domain/pour-card/judge-metal.ts';
import { formatPercent } from '#shared/lib/units.ts';
import type { UnitWriter } from '#kiosk/lib/unit-writer.ts';
import type { LotCharge } from './use-lot-charge.ts';

/** What the charge step says at one moment of weighing in by lot. */
export interface LotChargeWords {
  readonly sentence: string;
  /** The number that matters, with its unit. */
  readonly mass: string;
  readonly state: 'wait' | 'ready' | 'caution';
  readonly stateWords: string;
  readonly sub: string;
  /** What the step waits for; null when it may close. */
  readonly blocked: string | null;
}

type Judged = Pick<CardState, 'charge' | 'lots'>;
type Said = Pick<LotChargeWords, 'sentence' | 'mass' | 'state' | 'stateWords' | 'blocked'>;

/** Which lot, and how much of it, in the order of a sentence. */
const remedyWords = ({ out, add }: ChargeAdvice, write: UnitWriter): string => {
  const parts = [
    ...(out ? [`take ${write.mass(out.massG)} of lot ${out.code} out`] : []),
    ...(add ? [`add ${write.mass(add.massG)} of lot ${add.code}`] : []),
  ].join(', or ');
  return parts === '' ? '' : `${parts.charAt(0).toUpperCase()}${parts.slice(1)}.`;
};

const faultWords = ({ fault }: ChargeAdvice, context: CardContext, metal: MetalVerdict | null): string => {
  switch (fault) {
    case 'no-lot':
      return 'Metal of no lot is in';
    case 'too-much':
      return 'Too much in the crucible';
    case 'too-many-returns':
      return `Returns over ${formatPercent(context.limits.returnsShare)}`;
    case 'below-mark':
      return `At worst ${formatFineness(metal?.worstPpt ?? 0)}: below the mark`;
  }
};

const adviceWords = (advice: ChargeAdvice, state: Judged, context: CardContext, write: UnitWriter): Said => {
  const metal = judgeMetal(state, context);
  const massG = advice.out?.massG ?? advice.add?.massG ?? metal?.unlottedG ?? 0;
  return {
    sentence: remedyWords(advice, write) || 'Take it out, and weigh it in by its lot.',
    mass: write.mass(massG),
    state: 'caution',
    stateWords: faultWords(advice, context, metal),
    blocked: 'Melt opens when this is put right',
  };
};

const nextWords = (line: ChargeLineState, write: UnitWriter): Said => {
  const { code, kind, inG, toGoG } = line;
  const before = correctedFromG(line);
  const wanted = write.mass(inG + toGoG);
  const stateWords =
    before !== null ? `Instead of ${write.mass(before)}` : inG > 0 ? `To go, of ${wanted}` : 'To go';
  return {
    sentence: `Weigh in ${lotKindNames[kind]}, lot ${code}.`,
    mass: write.mass(toGoG),
    state: 'wait',
    stateWords,
    blocked: `Melt opens when lot ${code} is in`,
  };
};

const shortWords = ({ short }: LotCharge, toGo: string, write: UnitWriter): Said | null => {
  if (!short) return null;
  const [metal] = short.wouldDo;
  return {
    sentence: short.obstacles[0] ?? 'The metal on hand no longer makes this charge.',
    mass: metal ? write.mass(metal.massG) : toGo,
    state: 'caution',
    stateWords: metal ? `of ${metal.name} would do` : 'Take some out, or ask at the desk',
    blocked: 'Melt opens when this is put right',
  };
};

const freeWords = (toGo: string, range: string): Said => ({
  sentence: 'Scan a lot, then weigh it in.',
  mass: toGo,
  state: 'wait',
  stateWords: 'To go in all',
  blocked: `Melt opens at ${range}`,
});

const offWords = (metal: MetalVerdict | null): string | null => {
  const [off] = metal?.offWt ?? [];
  if (!off) return null;
  return `${Math.abs(off.wt).toFixed(2)} wt% too ${off.wt > 0 ? 'much' : 'little'} ${metalName(off.element)}`;
};

const restWords: Readonly<Record<LotCharge['rest'], string>> = {
  'as-planned': '',
  corrected: '',
  asking: 'Working out what remains.',
  unknown: 'No answer from the server: what remains is not corrected.',
};

const say = (charge: LotCharge, state: Judged, context: CardContext, write: UnitWriter): Said => {
  const verdict = judgeCharge(state, context);
  const metal = judgeMetal(state, context);
  const toGo = write.mass(Math.max(0, context.plannedMetalG - verdict.totalG));
  const { advice, next, rest } = charge;
  const isMending = rest === 'corrected' && next !== null && advice?.fault === 'below-mark';
  if (advice && !isMending) return adviceWords(advice, state, context, write);
  const off = offWords(metal);
  if (verdict.kind === 'good' && (next === null || (metal && off === null))) {
    const isOff = off !== null;
    return {
      sentence: 'The whole charge is in.',
      mass: write.mass(verdict.totalG),
      state: isOff ? 'caution' : 'ready',
      stateWords: off ?? (rest === 'as-planned' ? 'Ready, as planned' : 'Ready, as corrected'),
      blocked: null,
    };
  }
  const short = shortWords(charge, toGo, write);
  if (short) return short;
  if (next) return nextWords(next, write);
  return freeWords(toGo, `${write.mass(verdict.lowG)} to ${write.mass(verdict.highG)}`);
};

/** Puts a charge by lots into words: the next lot and how much of it is to go, or what stands in the way. */
export const lotChargeWords = (
  charge: LotCharge,
  state: Judged,
  context: CardContext,
  write: UnitWriter,
): LotChargeWords => {
  const { totalG } = judgeCharge(state, context);
  const isIn = `${write.mass(totalG)} of ${write.mass(context.plannedMetalG)} is in.`;
  const after = charge.lines.filter((line) => line.state === 'to-come').at(0);
  const then = after ? ` Then lot ${after.code}.` : '';
  const rest = restWords[charge.rest];
  return { ...say(charge, state, context, write), sub: `${isIn}${rest === '' ? then : ` ${rest}`}` };
};
