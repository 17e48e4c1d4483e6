import type { ReactNode } from 'react';

/** Props of {@link CountdownRing}. */
export interface CountdownRingProps {
  /** Share of the time still left, 1 to 0. */
  readonly left: number;
  /** The time left in words, such as "41 s left in the pour window"; not announced as it runs. */
  readonly label: string;
  /** Draws the ring in ember when the end is near. */
  readonly urgent?: boolean;
  readonly children?: ReactNode;
  readonly className?: string;
}

/** A ring that empties clockwise around its content as time runs out. */
export const CountdownRing = ({ left, label, urgent = false, children, className }: CountdownRingProps) => {
  const share = Math.min(1, Math.max(0, left));
  return (
    <div
      role="timer"
      aria-label={label}
      className={`relative aspect-square ${className ?? 'w-full max-w-[380px]'}`}
    >
      <svg viewBox="-50 -50 100 100" className="absolute inset-0 size-full" fill="none" aria-hidden="true">
        <circle r="46.5" className="stroke-line" strokeWidth="4" />
        {share > 0 ? (
          <circle
            r="46.5"
            className={urgent ? 'stroke-ember' : 'stroke-ink'}
            strokeWidth={urgent ? 6 : 4}
            pathLength="1"
            strokeDasharray={`${share} 1`}
            // Turned so that the gap grows from the top, the way a clock's hand goes.
            transform={`rotate(${-90 + (1 - share) * 360})`}
            data-part="left"
          />
        ) : null}
      </svg>
      <div className="absolute inset-[10%] grid place-items-center">{children}</div>
    </div>
  );
};
