import { useRef, type ReactNode } from 'react';
import { cx } from './cx.ts';
import { useOverflows } from './use-overflows.ts';

/** Props of {@link TerminalFrame}: the parts of a guided step, each in its own place. */
export interface TerminalFrameProps {
  /** Flask code, alloy chip and a few words, from left to right. */
  readonly top: ReactNode;
  /** The stop control, at the right of the top strip. */
  readonly stop?: ReactNode;
  /** The casting tree. */
  readonly tree?: ReactNode;
  /** The one sentence that says what to do. */
  readonly sentence: string;
  /** The one number that matters, already written out. */
  readonly number?: string;
  /** Its unit or a word, such as "°C" or "left". */
  readonly unit?: string;
  /** A `StateMark` of size `terminal`. */
  readonly state?: ReactNode;
  /** A quieter line below the state. */
  readonly sub?: ReactNode;
  /** Anything more below, such as figures with their basis or a list of prompts. */
  readonly children?: ReactNode;
  /** The one gauge, or a pad while a number is typed. */
  readonly gauge?: ReactNode;
  /** Buttons of size `terminal`; each grows, an element with `grow-2` twice as wide. */
  readonly actions: ReactNode;
}

const whole = /([A-Z]-\d{4,6}-\d|\d+ °[CF])/;

/** Text whose codes, such as M-0006-3, and temperatures stay on one line. */
const unbroken = (text: string): ReactNode =>
  text.split(whole).map((part, index) =>
    index % 2 === 1 ? (
      <span key={index} className="whitespace-nowrap">
        {part}
      </span>
    ) : (
      part
    ),
  );

/** Letters of a unit that find room beside five digits of the largest size. */
const shortUnit = 2;

// Five digits and a short unit fill the column at 188 px; what is longer gets smaller but never below 120 px of type.
const numberSize = (number: string, unit = ''): string => {
  const places = number.length + (unit.length > shortUnit ? 1 : 0);
  return places <= 5 ? 'text-[188px]' : places <= 6 ? 'text-[150px]' : 'text-[124px]';
};

/**
 * The layout of one guided step on a terminal, 1280 × 800 or 800 × 1280: one sentence, one number, one gauge, one
 * action. It fills the window and scrolls inside when there is more to read than room.
 */
export const TerminalFrame = (props: TerminalFrameProps) => {
  const main = useRef<HTMLElement>(null);
  const scrolls = useOverflows(main);
  return (
    <div className="grid fill-screen grid-rows-[auto_minmax(0,1fr)_auto] gap-4 bg-ground px-8 pt-5 pb-7 text-ink">
      <header className="flex min-h-18 items-center gap-5 text-2xl text-soft">
        <div className="flex flex-1 flex-wrap items-center gap-x-[22px] gap-y-1">{props.top}</div>
        <div className="shrink-0 text-ink">{props.stop}</div>
      </header>
      <main
        ref={main}
        className="terminal-step min-h-0 overflow-x-clip overflow-y-auto"
        tabIndex={scrolls ? 0 : undefined}
      >
        {props.tree ? <div className="[grid-area:tree]">{props.tree}</div> : null}
        <div className="min-w-0 pt-3 [grid-area:words]">
          <h1 className="text-[40px] leading-[1.18] font-extrabold text-balance">
            {unbroken(props.sentence)}
          </h1>
          {props.number === undefined ? null : <TheNumber number={props.number} unit={props.unit} />}
          {props.state ? <div className="mt-5">{props.state}</div> : null}
          {props.sub ? <div className="mt-2 text-[26px] leading-[1.35] text-soft">{props.sub}</div> : null}
          {props.children ? <div className="mt-5">{props.children}</div> : null}
        </div>
        {props.gauge ? <div className="min-h-0 [grid-area:gauge]">{props.gauge}</div> : null}
      </main>
      <footer className="terminal-actions">{props.actions}</footer>
    </div>
  );
};

const TheNumber = ({ number, unit }: { readonly number: string; readonly unit: string | undefined }) => (
  <p
    className={cx(
      'mt-5 flex items-start leading-none font-black tracking-[-0.027em]',
      numberSize(number, unit),
    )}
  >
    <span>{number}</span>
    {unit ? (
      <span className="mt-[0.12em] ml-2.5 text-[64px] font-extrabold tracking-normal text-soft">{unit}</span>
    ) : null}
  </p>
);
