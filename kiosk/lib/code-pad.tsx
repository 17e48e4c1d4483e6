import { Button } from '#src/ui/button.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { NumberPad } from '#src/ui/number-pad.tsx';
import { useState } from 'react';
import { scanWords, type ScannedThing } from './scanned-things.ts';

/** Props of {@link CodePad}. */
export interface CodePadProps {
  readonly of?: ScannedThing;
  readonly onClose: () => void;
  readonly onCode: (code: string) => void;
}

/** A pad for the number on a flask or a label, its small last digit included. */
export const CodePad = ({ of = 'flask', onClose, onCode }: CodePadProps) => {
  const [digits, setDigits] = useState('');
  const words = scanWords[of];
  const isEnough = digits.length >= 5;
  const send = (): void => {
    if (isEnough) onCode(digits);
  };
  return (
    <Dialog
      open
      onClose={onClose}
      title={words.typeTitle}
      size="terminal"
      actions={
        <Button kind={isEnough ? 'main' : 'blocked'} size="terminal" className="flex-1" onClick={send}>
          {isEnough ? words.find : 'All digits, the small last one too'}
        </Button>
      }
    >
      <div className="grid justify-items-center [&_[role=group]>div]:!grid-rows-[repeat(4,72px)]">
        <NumberPad
          label={words.label}
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
