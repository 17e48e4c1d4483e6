/** Props of {@link Spinner}. */
export interface SpinnerProps {
  /** What is being waited for; without it the spinner is decoration beside words that say so. */
  readonly label?: string;
  readonly className?: string;
}

/** A turning ring; it stands still when motion is unwanted, so its words must carry the meaning. */
export const Spinner = ({ label, className = 'size-[1.25em]' }: SpinnerProps) => (
  <span role={label ? 'status' : undefined} className="inline-flex items-center gap-[0.6em]">
    <svg viewBox="-20 -20 40 40" className={`shrink-0 ${className}`} fill="none" aria-hidden="true">
      <circle r="15" stroke="currentColor" strokeOpacity="0.25" strokeWidth="6" />
      <path
        className="turning"
        d="M0 -15 A15 15 0 0 1 15 0"
        stroke="currentColor"
        strokeWidth="6"
        strokeLinecap="round"
      />
    </svg>
    {label}
  </span>
);
