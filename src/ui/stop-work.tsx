/** Props of {@link StopWork}. */
export interface StopWorkProps {
  /** Runs at once: a stop is never held or asked twice. */
  readonly onStop: () => void;
  readonly label?: string;
}

/** The stop control of every hot step: an octagon with its words. */
export const StopWork = ({ onStop, label = 'Stop work' }: StopWorkProps) => (
  <button
    type="button"
    onClick={onStop}
    className="inline-flex min-h-18 min-w-18 touch-manipulation items-center gap-3.5 rounded-2xl px-2 text-2xl font-black whitespace-nowrap select-none"
  >
    <svg viewBox="-28 -28 56 56" className="size-14 shrink-0" aria-hidden="true">
      <path
        d="M-10.4 -25 H10.4 L25 -10.4 V10.4 L10.4 25 H-10.4 L-25 10.4 V-10.4 Z"
        className="fill-panel"
        stroke="currentColor"
        strokeWidth="5.5"
        strokeLinejoin="round"
      />
      <path d="M-12 0 H12" stroke="currentColor" strokeWidth="8.5" />
    </svg>
    {label}
  </button>
);
