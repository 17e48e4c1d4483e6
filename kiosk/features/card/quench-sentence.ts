import type { QuenchRule } from '#shared/domain/alloy/quench-rule.ts';
import type { ClockFace } from '#kiosk/lib/running-clock.ts';

/** The one sentence of the quench: wait, quench now, or it is late. */
export const quenchSentence = (
  face: Pick<ClockFace, 'state'>,
  { medium, latestS }: Pick<QuenchRule, 'medium' | 'latestS'>,
  waiting: string,
): string => {
  const into = medium === 'air' ? 'Let it cool in air now.' : `Quench it in ${medium} now.`;
  if (face.state === 'wait') return waiting;
  if (face.state === 'caution') return `It is late. ${into}`;
  return latestS === null ? into : `${into} Not later.`;
};
