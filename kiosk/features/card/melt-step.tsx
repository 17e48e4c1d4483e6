import { useMemo, useState } from 'react';
import { lastReading } from '#shared/domain/pour-card/card-state.ts';
import { Button } from '#src/ui/button.tsx';
import { HoldButton } from '#src/ui/hold-button.tsx';
import { MeltBeam } from '#src/ui/melt-beam.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { CardFrame } from './card-frame.tsx';
import { meltColumn } from './melt-column.ts';
import { meltSolidAt } from './melt-balance.ts';
import { MeltReading } from './melt-reading.tsx';
import { meltWords, type MeltWords } from './melt-words.ts';
import type { RunningCard } from './use-running-card.ts';

const useMeltSolid = ({ card }: RunningCard, readingC: number | null) => {
  const { compositionWt, rangeBasis, casting } = card;
  return useMemo(
    () =>
      readingC === null || rangeBasis === 'measured'
        ? null
        : meltSolidAt(compositionWt, casting.alloy.family, readingC),
    [compositionWt, rangeBasis, casting.alloy.family, readingC],
  );
};

const wordsBefore = ({ card, write }: RunningCard): MeltWords => ({
  sentence: card.instruction.sentences.melt,
  state: 'wait',
  stateWords: 'No reading yet',
  blocked: `Flask out opens at ${write.temperature(card.context.figures.pourC.low)}`,
});

/** The metal melts: readings, how much is still solid, and whether it is ready. */
export const MeltStep = ({ running }: { readonly running: RunningCard }) => {
  const { card, state, write, record } = running;
  const { figures } = card.context;
  const [isTyping, setIsTyping] = useState(false);
  const readingC = lastReading(state)?.temperatureC ?? null;
  const solid = useMeltSolid(running, readingC);
  if (isTyping) return <MeltReading running={running} onDone={() => setIsTyping(false)} />;
  const words =
    readingC === null
      ? wordsBefore(running)
      : meltWords(readingC, figures, solid?.solidMassFraction ?? null, write);
  const isMeasured = card.rangeBasis === 'measured';
  return (
    <CardFrame
      running={running}
      sentence={words.sentence}
      number={readingC === null ? '–' : write.degrees(readingC)}
      unit={write.degreeUnit}
      state={<StateMark state={words.state} text={words.stateWords} size="terminal" />}
      sub={`All liquid at ${write.temperature(figures.liquidusC)}${isMeasured ? ' (measured range, not computed)' : ''}. Pour between ${write.degrees(figures.pourC.low)} and ${write.temperature(figures.pourC.high)}. Hold at ${write.temperature(figures.meltHoldC)}.`}
      gauge={
        <MeltBeam
          {...meltColumn(figures)}
          readingC={readingC}
          balance={solid?.balance ?? null}
          format={write.degrees}
          unit={write.degreeUnit}
          className="size-full"
        />
      }
      actions={
        <>
          <Button
            size="terminal"
            icon="thermometer"
            kind={words.blocked === null ? 'plain' : 'main'}
            onClick={() => setIsTyping(true)}
          >
            Type a reading
          </Button>
          {words.blocked === null ? (
            <HoldButton className="grow-2" onHeld={() => record({ type: 'melt-ready' })}>
              Ready. Hold for flask out
            </HoldButton>
          ) : (
            <Button kind="blocked" size="terminal" className="grow-2">
              {words.blocked}
            </Button>
          )}
        </>
      }
    />
  );
};
