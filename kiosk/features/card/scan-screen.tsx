import { useState } from 'react';
import { parseFlaskCode } from '#shared/lib/codes.ts';
import type { StepOf } from '#shared/domain/instruction/instruction-step.ts';
import { Button } from '#src/ui/button.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { CodePad } from '#kiosk/lib/code-pad.tsx';
import { ScanFrame } from '#kiosk/lib/scan-frame.tsx';
import { useScanner } from '#kiosk/lib/use-scanner.ts';
import { CardFrame } from './card-frame.tsx';
import { judgeHere } from './judge-here.ts';
import { SkipStep, type StepProps } from './skip-step.tsx';

/** The flask's own code again, by camera, scanner or pad, so that the right one is in hand. */
export const ScanScreen = ({ running, step }: StepProps<StepOf<'scan'>>) => {
  const [isTyping, setIsTyping] = useState(false);
  const [wrong, setWrong] = useState<string | null>(null);
  const answer = (code: string): void => {
    const verdict = judgeHere(running, step, { kind: 'scan', code });
    setWrong(verdict.kind === 'good' ? null : verdict.sentence);
    if (verdict.kind === 'good')
      running.record({ type: 'step-done', key: step.key, answer: { kind: 'scan', code } });
  };
  const take = (text: string): void => {
    setIsTyping(false);
    const parsed = parseFlaskCode(text);
    if (parsed.ok) answer(parsed.value);
    else setWrong(parsed.error);
  };
  useScanner((code) => {
    take(code);
    return true;
  });
  const flaskCode = running.card.casting.flask.code;
  return (
    <CardFrame
      running={running}
      sentence={step.sentence}
      state={
        <span role="alert" className="block min-h-12">
          {wrong ? (
            <StateMark state="caution" text={wrong} size="terminal" />
          ) : (
            <StateMark state="wait" text="Show the flask’s code" size="terminal" />
          )}
        </span>
      }
      gauge={<ScanFrame onCode={take} className="h-full" />}
      actions={
        <>
          <SkipStep running={running} step={step} />
          {running.practice ? (
            <Button size="terminal" onClick={() => answer(flaskCode)}>
              Practice: take it as shown
            </Button>
          ) : null}
          <Button size="terminal" icon="pad" className="grow-2" onClick={() => setIsTyping(true)}>
            Type its number
          </Button>
        </>
      }
    >
      {isTyping ? <CodePad onClose={() => setIsTyping(false)} onCode={take} /> : null}
    </CardFrame>
  );
};
