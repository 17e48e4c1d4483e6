import { splitCode } from '#shared/lib/codes.ts';
import { AlloyChip } from '#src/ui/alloy-chip.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { clockFace, stepWords, type RunningClock } from './running-clock.ts';
import { firstName } from './presence.ts';

const Face = ({ running, nowMs }: { readonly running: RunningClock; readonly nowMs: number }) => {
  if (!running.time || running.isStopped) {
    const state = running.isStopped ? 'stop' : 'ready';
    return <StateMark state={state} text={stepWords(running)} size="desk" />;
  }
  const face = clockFace(running.time, nowMs);
  return (
    <span role="timer" aria-label={`${face.clock} ${face.words}`} className="grid justify-items-end">
      <span className={`text-[52px] leading-none font-black ${face.isUrgent ? 'text-ember' : ''}`}>
        {face.clock}
      </span>
      <StateMark state={face.isUrgent ? 'caution' : face.state} text={face.words} size="desk" />
    </span>
  );
};

/** A running card in one row: which flask, whose, and its clock. */
export const RunningRow = ({
  running,
  nowMs,
}: {
  readonly running: RunningClock;
  readonly nowMs: number;
}) => (
  <span className="flex min-h-24 w-full items-center gap-5 text-left">
    <span className="grid gap-1">
      <span className="flex flex-wrap items-center gap-3 text-[30px] leading-tight font-black">
        {splitCode(running.flaskCode).main}
        <AlloyChip name={running.alloyName} metal={running.metal} size="terminal" />
      </span>
      <span className="text-xl text-soft">{firstName(running.person)} has it</span>
    </span>
    <span className="ml-auto">
      <Face running={running} nowMs={nowMs} />
    </span>
  </span>
);
