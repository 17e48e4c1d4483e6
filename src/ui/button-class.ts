import { cx } from './cx.ts';

/** How a button or a link that looks like one is drawn. */
export interface ButtonLook {
  /** `main` is the one action that matters; `blocked` waits for something and says what. */
  readonly kind?: 'main' | 'plain' | 'quiet' | 'blocked';
  /** `desk` is 46 px tall; `terminal` at least 88 px, for gloves. */
  readonly size?: 'desk' | 'terminal';
}

const kinds = {
  main: 'border-ember bg-ember text-on-ember',
  plain: 'border-ink bg-panel text-ink',
  quiet: 'border-transparent bg-transparent text-ink underline decoration-2 underline-offset-4',
  blocked: 'border-soft border-dashed bg-transparent text-soft',
} as const;

const sizes = {
  desk: 'min-h-[46px] gap-2 rounded-[14px] border-[2.5px] px-[18px] text-base',
  terminal: 'min-h-22 gap-[18px] rounded-[26px] border-[3px] px-7 py-2 text-[28px] leading-tight',
} as const;

/** The classes of a button, for links that must look like one. */
export const buttonClass = ({ kind = 'plain', size = 'desk' }: ButtonLook = {}, more?: string): string =>
  cx(
    'inline-flex touch-manipulation items-center justify-center text-center font-black select-none',
    kinds[kind],
    sizes[size],
    more,
  );
