import { useState } from 'react';
import { useEnrolTerminal } from '#src/api/terminals.ts';
import { sentenceOf } from '#src/lib/http.ts';
import { Button } from '#src/ui/button.tsx';
import { NumberPad } from '#src/ui/number-pad.tsx';
import { TerminalFrame } from '#src/ui/terminal-frame.tsx';
import { Wordmark } from '#src/ui/wordmark.tsx';

const digits = 8;

/** The code as it is written at the desk, in two groups of four with a dot for each digit to come. */
const grouped = (code: string): string => {
  const places = code.padEnd(digits, '·');
  return `${places.slice(0, 4)} ${places.slice(4)}`;
};

/** Makes this device a terminal: how, and a pad for the eight-digit code. */
export const EnrolScreen = ({ studioName }: { readonly studioName: string }) => {
  const [code, setCode] = useState('');
  const enrol = useEnrolTerminal();
  const isComplete = code.length === digits;
  const send = (): void => {
    if (isComplete && !enrol.isPending) enrol.mutate({ code }, { onError: () => setCode('') });
  };
  const change = (next: string): void => {
    enrol.reset();
    setCode(next);
  };
  return (
    <TerminalFrame
      top={
        <>
          <span className="text-ink">
            <Wordmark size="terminal" />
          </span>
          <span>{studioName}</span>
        </>
      }
      sentence="This device is not a terminal yet. Type its code from the desk."
      number={grouped(code)}
      sub={
        enrol.error ? (
          <span role="alert" className="font-extrabold text-ink">
            {sentenceOf(enrol.error)}
          </span>
        ) : (
          'At the desk the owner opens People and terminals, adds a terminal, and reads out its eight digits. The code works once.'
        )
      }
      gauge={
        <NumberPad
          label="Enrolment code"
          value={code}
          onChange={change}
          onEnter={send}
          decimals={false}
          maxLength={digits}
          showValue={false}
        />
      }
      actions={
        <Button kind={isComplete ? 'main' : 'blocked'} size="terminal" busy={enrol.isPending} onClick={send}>
          {isComplete ? 'Enrol this terminal' : 'Enrol opens after eight digits'}
        </Button>
      }
    />
  );
};
