import { judgeReading } from '#shared/domain/pour-card/judge-reading.ts';
import { ReadingEntry } from './reading-entry.tsx';
import type { RunningCard } from './use-running-card.ts';

/** A reading of the melt, as the pyrometer shows it. */
export const MeltReading = ({
  running,
  onDone,
}: {
  readonly running: RunningCard;
  readonly onDone: () => void;
}) => {
  const { figures, limits, units } = running.card.context;
  return (
    <ReadingEntry
      running={running}
      sentence="What does the pyrometer show?"
      label="Melt temperature"
      judge={(typed) => judgeReading(typed, units.temperature, figures, limits)}
      onReading={(temperatureC, confirmed) => {
        if (running.record({ type: 'reading-taken', temperatureC, confirmed })) onDone();
      }}
      onCancel={onDone}
    />
  );
};
