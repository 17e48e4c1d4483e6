import { useState } from 'react';
import { cx } from './cx.ts';
import { DefinitionList } from './definition-list.tsx';
import { Dialog } from './dialog.tsx';

/** How a figure was come by: the rule in words, what went in, and where the rule is from. */
export interface Basis {
  readonly rule: string;
  readonly inputs: readonly { readonly label: string; readonly value: string }[];
  readonly source: string;
}

/** Props of {@link FigureBasis}. */
export interface FigureBasisProps {
  readonly label: string;
  /** The figure with its unit, already written out. */
  readonly value: string;
  readonly basis: Basis;
  readonly size?: 'desk' | 'terminal';
}

const sizes = {
  desk: { button: 'min-h-11 px-1 rounded-lg gap-0', label: 'text-[15px]', value: 'text-xl' },
  terminal: { button: 'min-h-18 px-3 rounded-2xl gap-0.5', label: 'text-[21px]', value: 'text-[34px]' },
} as const;

/** A figure that shows, when pressed, the rule, the inputs and the source it was computed from. */
export const FigureBasis = ({ label, value, basis, size = 'desk' }: FigureBasisProps) => {
  const [open, setOpen] = useState(false);
  const look = sizes[size];
  return (
    <>
      <button
        type="button"
        aria-haspopup="dialog"
        onClick={() => setOpen(true)}
        className={cx('inline-grid touch-manipulation content-center text-left', look.button)}
      >
        <span className={cx('leading-tight font-bold text-soft', look.label)}>{label}</span>
        <span
          className={cx(
            'leading-tight font-black underline decoration-dotted decoration-[0.09em] underline-offset-[0.2em]',
            look.value,
          )}
        >
          {value}
        </span>
        <span className="sr-only">How this figure was come by</span>
      </button>
      <Dialog open={open} onClose={() => setOpen(false)} title={`${label}: ${value}`} size={size}>
        <div className="grid gap-[1em]">
          <p className="leading-snug">{basis.rule}</p>
          <DefinitionList
            items={basis.inputs.map((input) => ({ term: input.label, value: input.value }))}
            size={size}
          />
          <p className="text-soft">
            <span className="font-extrabold">Source: </span>
            {basis.source}
          </p>
        </div>
      </Dialog>
    </>
  );
};
