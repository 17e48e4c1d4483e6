import { StateMark } from '#src/ui/state-mark.tsx';
import { CardWalk } from './card-walk.tsx';
import { usePracticeCard, type PracticeSetUp } from './use-practice-card.ts';

/** A card walked without a record, under a band that says so on every screen. */
export const PracticeWalk = (setUp: PracticeSetUp) => {
  const running = usePracticeCard(setUp);
  return (
    <div className="practice">
      <div
        role="note"
        className="grid h-[var(--band)] place-items-center overflow-hidden border-b-[4px] border-dashed border-ink bg-panel text-ink"
      >
        <StateMark state="caution" text="Practice: nothing is recorded" size="terminal" />
      </div>
      <CardWalk running={running} />
    </div>
  );
};
