import { pressKey } from './decimal-text.ts';
import { PadKeys } from './pad-keys.tsx';

/** Props of {@link PinPad}. */
export interface PinPadProps {
  /** Whose PIN, such as "PIN of Ines". */
  readonly label: string;
  /** The digits typed so far; the parent keeps and clears them. */
  readonly value: string;
  readonly onChange: (value: string) => void;
  readonly onEnter?: () => void;
  /** Places drawn at first; more appear as more is typed. */
  readonly places?: number;
  readonly maxLength?: number;
  readonly disabled?: boolean;
}

const spoken = (count: number): string => (count === 1 ? '1 digit typed' : `${count} digits typed`);

/** A pad for a PIN: it shows a dot for each digit and never the digits. */
export const PinPad = ({
  label,
  value,
  onChange,
  onEnter,
  places = 6,
  maxLength = 12,
  disabled = false,
}: PinPadProps) => (
  <div role="group" aria-label={label} className="grid w-full max-w-[560px] gap-6">
    <output aria-live="polite" className="flex min-h-12 items-center justify-center gap-5">
      <span className="sr-only">{spoken(value.length)}</span>
      {Array.from({ length: Math.max(places, value.length) }, (_, place) => (
        <span
          key={place}
          className={`size-7 rounded-full border-4 border-ink ${place < value.length ? 'bg-ink' : 'bg-transparent'}`}
        />
      ))}
    </output>
    <PadKeys
      decimals={false}
      disabled={disabled}
      onEnter={onEnter}
      onKey={(key) => onChange(pressKey(value, key, { decimals: false, maxLength }))}
    />
  </div>
);
