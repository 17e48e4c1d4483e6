import { useId, useRef } from 'react';
import { buttonClass, type ButtonLook } from './button-class.ts';
import { useHold, type HoldPhase } from './use-hold.ts';
import { useWindowKey } from './use-window-key.ts';

/** Props of {@link HoldButton}. */
export interface HoldButtonProps {
  /** What has happened or will happen once held, such as "Poured". */
  readonly children: React.ReactNode;
  readonly onHeld: () => void;
  /** Time of the hold in milliseconds. */
  readonly holdMs?: number;
  /** `KeyboardEvent.key` a foot pedal types; one press anywhere in the window does at once what the hold does. */
  readonly pedalKey?: string;
  readonly disabled?: boolean;
  readonly kind?: Extract<ButtonLook['kind'], 'main' | 'plain'>;
  readonly size?: ButtonLook['size'];
  readonly className?: string;
}

const spoken: Readonly<Record<HoldPhase, string>> = {
  idle: '',
  holding: 'Keep holding.',
  held: 'Done. Let go.',
};

const sameKey = (a: string, b: string): boolean => a.toLowerCase() === b.toLowerCase();

const HoldRing = ({ phase, holdMs }: { readonly phase: HoldPhase; readonly holdMs: number }) => (
  <svg
    viewBox="-32 -32 64 64"
    className="size-[2em] shrink-0"
    fill="none"
    stroke="currentColor"
    aria-hidden="true"
  >
    <circle r="26" strokeOpacity="0.35" strokeWidth="9" />
    <circle
      r="26"
      className="hold-ring"
      data-holding={phase !== 'idle'}
      style={{ '--hold-time': `${holdMs}ms` } as React.CSSProperties}
      pathLength="1"
      strokeDasharray="1 1"
      strokeWidth="9"
      transform="rotate(-90)"
    />
    {phase === 'held' ? (
      <path d="m-11 1 8 8 14-17" strokeWidth="8" strokeLinecap="round" strokeLinejoin="round" />
    ) : null}
  </svg>
);

/**
 * A final action: nothing happens until it has been held for `holdMs` (a brush of a glove is not enough), while a ring
 * fills; a foot pedal that types `pedalKey` does the same with one press, since both hands may be full.
 */
export const HoldButton = ({
  children,
  onHeld,
  holdMs = 900,
  pedalKey,
  disabled = false,
  kind = 'main',
  size = 'terminal',
  className,
}: HoldButtonProps) => {
  const hint = useId();
  const button = useRef<HTMLButtonElement>(null);
  const { phase, handlers, release } = useHold(onHeld, holdMs, disabled);
  useWindowKey(
    button,
    (event) => {
      if (!pedalKey || !sameKey(event.key, pedalKey)) return false;
      if (event.repeat) return true;
      release();
      onHeld();
      return true;
    },
    pedalKey !== undefined && !disabled,
  );
  return (
    <>
      <button
        ref={button}
        type="button"
        {...handlers}
        aria-disabled={disabled || undefined}
        aria-describedby={hint}
        data-phase={phase}
        data-kind={disabled ? 'blocked' : kind}
        className={buttonClass({ kind: disabled ? 'blocked' : kind, size }, `touch-none ${className ?? ''}`)}
      >
        <HoldRing phase={phase} holdMs={holdMs} />
        <span>{children}</span>
      </button>
      <span id={hint} className="sr-only">
        Press and hold{pedalKey ? ', or press the pedal once' : ''}. Letting go early does nothing.
      </span>
      <span role="status" className="sr-only">
        {spoken[phase]}
      </span>
    </>
  );
};
