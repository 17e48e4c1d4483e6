import { useRef } from 'react';
import { cx } from './cx.ts';
import { padKeyOf, type PadKey } from './decimal-text.ts';
import { Icon } from './icon.tsx';
import { useWindowKey } from './use-window-key.ts';

/** Props of {@link PadKeys}. */
export interface PadKeysProps {
  readonly onKey: (key: PadKey) => void;
  readonly decimals: boolean;
  /** Runs on the Enter key of a keyboard, unless a button has the focus and takes it. */
  readonly onEnter?: () => void;
  readonly disabled: boolean;
}

const rows: readonly (readonly PadKey[])[] = [
  ['1', '2', '3', 'erase'],
  ['4', '5', '6'],
  ['7', '8', '9', 'clear'],
];

const faces: Partial<Record<PadKey, { readonly name: string; readonly face: React.ReactNode }>> = {
  erase: { name: 'Erase the last digit', face: <Icon name="erase" className="size-10" /> },
  clear: { name: 'Clear', face: <span className="text-2xl">Clear</span> },
  '.': { name: 'Decimal point', face: <span className="leading-none">.</span> },
};

const keyClass =
  'min-h-18 min-w-18 touch-manipulation rounded-[22px] border-[3px] border-ink bg-panel text-[46px] font-black select-none active:bg-ember-soft';

const isOnButton = (target: EventTarget | null): boolean =>
  target instanceof Element && target.closest('button, a') !== null;

/** The keys of a pad for gloves, which hear the keyboard as well. */
export const PadKeys = ({ onKey, decimals, onEnter, disabled }: PadKeysProps) => {
  const pad = useRef<HTMLDivElement>(null);
  useWindowKey(
    pad,
    (event) => {
      if (event.key === 'Enter') {
        if (!onEnter || event.repeat || isOnButton(event.target)) return false;
        onEnter();
        return true;
      }
      const key = padKeyOf(event.key);
      if (key === null) return false;
      onKey(key);
      return true;
    },
    !disabled,
  );
  const lastRow: readonly PadKey[] = decimals ? ['.', '0'] : ['0'];
  const button = (key: PadKey, place?: string) => (
    <button
      key={key}
      type="button"
      disabled={disabled}
      aria-label={faces[key]?.name}
      onClick={() => onKey(key)}
      className={cx(keyClass, 'grid place-items-center', place)}
    >
      {faces[key]?.face ?? key}
    </button>
  );
  return (
    <div ref={pad} className="grid grid-cols-4 grid-rows-[repeat(4,minmax(72px,112px))] gap-4">
      {rows.flat().map((key) => button(key, key === 'erase' || key === 'clear' ? 'row-span-2' : undefined))}
      {lastRow.map((key) => button(key, key === '.' ? undefined : decimals ? 'col-span-2' : 'col-span-3'))}
    </div>
  );
};
