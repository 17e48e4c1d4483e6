import { useId, type ComponentProps } from 'react';
import { FieldError, type FieldFrame } from './field.tsx';
import { Icon } from './icon.tsx';

/** Props of {@link CheckField}; the rest goes to the checkbox. */
export interface CheckFieldProps
  extends Omit<ComponentProps<'input'>, 'id' | 'type' | 'size' | 'className'>, FieldFrame {
  readonly size?: 'desk' | 'terminal';
}

const sizes = {
  desk: { row: 'min-h-8 gap-3', box: 'size-6 mt-0.5', label: 'text-base', hint: 'text-[15px]' },
  terminal: {
    row: 'min-h-18 gap-5 rounded-[22px] border-[3px] border-ink bg-panel px-6 py-4 items-center',
    box: 'size-11',
    label: 'text-[26px] leading-tight',
    hint: 'text-[20px]',
  },
} as const;

/** A yes-or-no field; at the terminal the whole row is the target. */
export const CheckField = ({ label, hint, error, size = 'desk', ...input }: CheckFieldProps) => {
  const id = useId();
  const look = sizes[size];
  const described = [hint && `${id}-hint`, error && `${id}-error`].filter(Boolean).join(' ');
  return (
    <div className="grid gap-1.5">
      <label htmlFor={id} className={`flex touch-manipulation select-none ${look.row}`}>
        <span className={`relative shrink-0 ${look.box}`}>
          <input
            {...input}
            id={id}
            type="checkbox"
            aria-describedby={described || undefined}
            aria-invalid={error ? true : undefined}
            className="peer size-full appearance-none rounded-[25%] border-[3px] border-ink bg-panel checked:bg-ink aria-invalid:border-ember"
          />
          <Icon
            name="tick"
            className="pointer-events-none absolute inset-0 m-auto size-[72%] text-ground opacity-0 peer-checked:opacity-100"
          />
        </span>
        <span className="grid gap-0.5">
          <span className={`font-extrabold ${look.label}`}>{label}</span>
          {hint ? (
            <span id={`${id}-hint`} className={`text-soft ${look.hint}`}>
              {hint}
            </span>
          ) : null}
        </span>
      </label>
      <FieldError id={`${id}-error`} error={error} />
    </div>
  );
};
