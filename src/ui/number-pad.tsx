import { pressKey } from './decimal-text.ts';
import { PadKeys } from './pad-keys.tsx';

/** Props of {@link NumberPad}. */
export interface NumberPadProps {
  /** What is being typed, such as "Melt temperature". */
  readonly label: string;
  /** The characters typed so far, with "." as the decimal point; never parsed here. */
  readonly value: string;
  readonly onChange: (value: string) => void;
  /** Runs on the Enter key of a keyboard. */
  readonly onEnter?: () => void;
  /** Unit shown after the figure. */
  readonly unit?: string;
  /** Whether there is a decimal point; without one the pad suits codes. */
  readonly decimals?: boolean;
  readonly maxLength?: number;
  /** Whether the pad shows what was typed; a screen that shows it as its one number turns this off. */
  readonly showValue?: boolean;
  readonly disabled?: boolean;
}

/** A pad for numbers at the furnace, in place of the system's keyboard; a keyboard or scale that types works too. */
export const NumberPad = ({
  label,
  value,
  onChange,
  onEnter,
  unit,
  decimals = true,
  maxLength = 9,
  showValue = true,
  disabled = false,
}: NumberPadProps) => (
  <div role="group" aria-label={label} className="grid w-full max-w-[560px] gap-4">
    <output
      aria-live="polite"
      aria-label={label}
      className={
        showValue
          ? 'flex min-h-20 items-baseline justify-end gap-3 border-b-4 border-ink px-2 text-[64px] leading-tight font-black'
          : 'sr-only'
      }
    >
      <span>{value === '' ? '\u2013' : value}</span>
      {unit ? <span className="text-3xl text-soft">{unit}</span> : null}
    </output>
    <PadKeys
      decimals={decimals}
      disabled={disabled}
      onEnter={onEnter}
      onKey={(key) => onChange(pressKey(value, key, { decimals, maxLength }))}
    />
  </div>
);
