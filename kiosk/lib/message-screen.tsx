import type { ReactNode } from 'react';
import { StateMark } from '#src/ui/state-mark.tsx';

/** Props of {@link MessageScreen}. */
export interface MessageScreenProps {
  readonly state: 'wait' | 'caution' | 'stop';
  /** What is so, in a word or two. */
  readonly mark: string;
  /** One sentence: what is wrong and what to do. */
  readonly sentence: string;
  readonly children?: ReactNode;
  /** Buttons of size `terminal`. */
  readonly actions?: ReactNode;
}

/** A whole screen for one message, large enough to be read from the furnace. */
export const MessageScreen = ({ state, mark, sentence, children, actions }: MessageScreenProps) => (
  <div className="grid fill-screen grid-rows-[minmax(0,1fr)_auto] gap-6 bg-ground px-8 pt-8 pb-7 text-ink">
    <main className="grid content-center gap-8 overflow-y-auto px-4">
      <StateMark state={state} text={mark} size="terminal" />
      <div role="alert">
        <h1 className="max-w-[24em] text-[52px] leading-[1.16] font-black text-balance">{sentence}</h1>
      </div>
      {children ? <div className="text-[28px] leading-snug text-soft">{children}</div> : null}
    </main>
    <footer className="terminal-actions">{actions}</footer>
  </div>
);
