import type { ReactNode } from 'react';
import type { RunningCard } from './use-running-card.ts';

/** Props of a screen that lies over a card's step for a while. */
export interface AsideProps {
  readonly running: RunningCard;
  /** The flask's strip. */
  readonly top: ReactNode;
  readonly onDone: () => void;
}
