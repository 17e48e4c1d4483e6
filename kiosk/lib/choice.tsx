import type { ReactNode } from 'react';
import { cx } from '#src/ui/cx.ts';

/** Props of {@link Choice}. */
export interface ChoiceProps {
  readonly isChosen: boolean;
  readonly onChoose: () => void;
  readonly children: ReactNode;
  readonly className?: string;
}

/** One of several answers that stand side by side; the chosen one is filled. */
export const Choice = ({ isChosen, onChoose, children, className }: ChoiceProps) => (
  <button
    type="button"
    aria-pressed={isChosen}
    onClick={onChoose}
    className={cx(
      'min-h-18 flex-1 touch-manipulation rounded-2xl border-[3px] border-ink px-2 font-black select-none',
      isChosen ? 'bg-ink text-ground' : 'bg-panel',
      className ?? 'text-xl whitespace-nowrap',
    )}
  >
    {children}
  </button>
);
