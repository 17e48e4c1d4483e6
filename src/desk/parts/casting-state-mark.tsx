import { describeCastingState, type CastingState } from '#shared/domain/casting/casting-state.ts';
import { Icon } from '#src/ui/icon.tsx';
import { StateMark, type State } from '#src/ui/state-mark.tsx';

const marks: Readonly<Partial<Record<CastingState, State>>> = {
  invested: 'wait',
  dewaxed: 'wait',
  'burning-out': 'wait',
  holding: 'ready',
  held: 'stop',
  scrapped: 'stop',
};

/** A casting's state as a shape and in words; what has been poured carries a tick. */
export const CastingStateMark = ({ state }: { readonly state: CastingState }) => {
  const mark = marks[state];
  const text = describeCastingState(state);
  return mark ? (
    <StateMark state={mark} text={text} size="row" />
  ) : (
    <span className="inline-flex items-center gap-2 align-bottom font-extrabold text-soft">
      <Icon name="tick" className="size-[18px]" />
      {text}
    </span>
  );
};
