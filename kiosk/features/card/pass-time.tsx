import { Button } from '#src/ui/button.tsx';
import type { RunningCard } from './use-running-card.ts';

/** Lets time pass that only a real card has to wait; nothing on a card that counts. */
export const PassTime = ({
  running,
  seconds,
}: {
  readonly running: RunningCard;
  readonly seconds: number;
}) =>
  running.practice ? (
    <Button size="terminal" icon="clock" onClick={() => running.practice?.passTime(seconds)}>
      Practice: let it pass
    </Button>
  ) : null;
