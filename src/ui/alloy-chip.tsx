import { cx } from './cx.ts';

/** Props of {@link AlloyChip}. */
export interface AlloyChipProps {
  /** The alloy's name in the studio, such as "18 ct yellow". */
  readonly name: string;
  /** Fineness in parts per thousand, already written out, such as "750". */
  readonly fineness?: string;
  readonly metal: 'gold' | 'silver';
  readonly size?: 'desk' | 'terminal';
}

const metals = {
  gold: 'bg-brass-soft text-brass',
  silver: 'bg-silver-soft text-silver',
} as const;

/** An alloy by name and fineness on a warm ground for gold, a cool one for silver. */
export const AlloyChip = ({ name, fineness, metal, size = 'desk' }: AlloyChipProps) => (
  <span
    className={cx(
      'inline-flex items-baseline gap-[0.5em] rounded-full font-extrabold whitespace-nowrap',
      metals[metal],
      size === 'terminal' ? 'px-[18px] py-1.5 text-[22px]' : 'px-3.5 py-0.5 text-base',
    )}
  >
    {name}
    {fineness ? <span className="font-black">{fineness}</span> : null}
  </span>
);
