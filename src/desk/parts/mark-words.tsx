import { judgeMark, type Marked } from '#shared/domain/metal/judge-mark.ts';
import { StateMark } from '#src/ui/state-mark.tsx';
import { useDeskSession } from './desk-session.ts';

/** A fineness held against the marks of the studio's place, in words, with whose rule it is. */
export const MarkWords = (marked: Marked) => {
  const { marksPlace } = useDeskSession().studio;
  const { reached, byTolerance, isListed, sentence } = judgeMark(marked, marksPlace);
  const source = (byTolerance ?? reached)?.source;
  return (
    <div className="grid gap-0.5">
      {isListed ? <p>{sentence}</p> : <StateMark state="caution" text={sentence} size="row" />}
      {source ? <p className="text-[15px] text-soft">{source}</p> : null}
    </div>
  );
};
