import { cx } from './cx.ts';

/** The four states a step or a record can be in: ready, waiting, caution, stopped. */
export type State = 'ready' | 'wait' | 'caution' | 'stop';

/** Props of {@link StateMark}. */
export interface StateMarkProps {
  readonly state: State;
  /** The state in words; shape and words say the same. */
  readonly text: string;
  /** Height of the letters: `row` 16 px, `desk` 20 px, `terminal` 38 px. */
  readonly size?: 'row' | 'desk' | 'terminal';
}

const octagon = 'M-8.3 -20 H8.3 L20 -8.3 V8.3 L8.3 20 H-8.3 L-20 8.3 V-8.3 Z';

const shapes: Readonly<Record<State, React.ReactNode>> = {
  ready: <circle r="20" fill="currentColor" />,
  wait: (
    <>
      <circle r="18.5" fill="none" stroke="currentColor" strokeWidth="5" />
      <path d="M-18.5 0 A18.5 18.5 0 0 0 18.5 0 Z" fill="currentColor" />
    </>
  ),
  caution: (
    <>
      <path
        d="M0 -19 L20.5 17 H-20.5 Z"
        fill="none"
        stroke="currentColor"
        strokeWidth="5"
        strokeLinejoin="round"
      />
      <path d="M0 -6 V5" stroke="currentColor" strokeWidth="5" strokeLinecap="round" />
      <circle cy="11" r="2.8" fill="currentColor" />
    </>
  ),
  stop: (
    <>
      <path d={octagon} fill="currentColor" />
      <path d="M-9 0 H9" className="stroke-ground" strokeWidth="7" />
    </>
  ),
};

const sizes = {
  row: { text: 'text-base gap-2 font-extrabold', mark: 'size-[18px]' },
  desk: { text: 'text-xl gap-2.5 font-black', mark: 'size-[22px]' },
  terminal: { text: 'text-[38px] leading-[1.15] gap-[18px] font-black', mark: 'size-[46px]' },
} as const;

/** A state as a shape with its words: full disc ready, half disc wait, triangle caution, octagon stop. */
export const StateMark = ({ state, text, size = 'desk' }: StateMarkProps) => (
  <span
    className={cx('inline-flex items-center', sizes[size].text, state === 'stop' && 'text-ember')}
    data-state={state}
  >
    <svg viewBox="-23 -23 46 46" className={cx('shrink-0', sizes[size].mark)} aria-hidden="true">
      {shapes[state]}
    </svg>
    <span className="text-pretty">{text}</span>
  </span>
);
