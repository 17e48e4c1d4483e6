import { Button } from '#src/ui/button.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { NumberPad } from '#src/ui/number-pad.tsx';
import { useEffect, useRef, useState } from 'react';

/** Props of {@link CodePad}. */
export interface CodePadProps {
  readonly onClose: () => void;
  readonly onCode: (code: string) => void;
}

/** A pad for the number on a flask, its small last digit included. */
export const CodePad = ({ onClose, onCode }: CodePadProps) => {
  const [digits, setDigits] = useState('');
  const find = useRef<HTMLButtonElement>(null);
  // The dialog gives the focus to its cross; Enter after the digits must find the flask instead.
  useEffect(() => find.current?.focus(), []);
  const isEnough = digits.length >= 5;
  const send = (): void => {
    if (isEnough) onCode(digits);
  };
  return (
    <Dialog
      open
      onClose={onClose}
      title="Type the flask’s number"
      size="terminal"
      actions={
        <Button
          ref={find}
          kind={isEnough ? 'main' : 'blocked'}
          size="terminal"
          className="flex-1"
          onClick={send}
        >
          {isEnough ? 'Find this flask' : 'All digits, the small last one too'}
        </Button>
      }
    >
      <div className="grid justify-items-center [&_[role=group]>div]:!grid-rows-[repeat(4,72px)]">
        <NumberPad
          label="Flask number"
          value={digits}
          onChange={setDigits}
          onEnter={send}
          decimals={false}
          maxLength={7}
        />
      </div>
    </Dialog>
  );
};
