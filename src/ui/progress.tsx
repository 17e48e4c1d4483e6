/** Props of {@link Progress}. */
export interface ProgressProps {
  readonly label: string;
  /** Work done so far, in the same unit as `max`. */
  readonly value: number;
  readonly max: number;
  /** The state in words, such as "140 of 312 rows"; defaults to a percentage. */
  readonly text?: string;
}

/** A bar that shows how far long work has come, in words too. */
export const Progress = ({ label, value, max, text }: ProgressProps) => {
  const percent = max > 0 ? Math.min(100, Math.max(0, (value / max) * 100)) : 0;
  const words = text ?? `${Math.floor(percent)} %`;
  return (
    <div className="grid gap-1.5">
      <div className="flex justify-between gap-4">
        <span className="font-extrabold">{label}</span>
        <span className="text-soft">{words}</span>
      </div>
      <div
        role="progressbar"
        aria-label={label}
        aria-valuemin={0}
        aria-valuemax={100}
        aria-valuenow={Math.floor(percent)}
        aria-valuetext={words}
        className="h-4 overflow-hidden rounded-full border-2 border-ink bg-panel"
      >
        <div className="h-full bg-ember-fill" style={{ width: `${percent}%` }} />
      </div>
    </div>
  );
};
