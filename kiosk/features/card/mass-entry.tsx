import type { ReactNode } from 'react';
import { Button } from '#src/ui/button.tsx';
import { NumberPad } from '#src/ui/number-pad.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { useTypedText } from '#kiosk/lib/use-typed-text.ts';
import { CardFrame } from './card-frame.tsx';
import { readTypedMass } from './typed-mass.ts';
import type { RunningCard } from './use-running-card.ts';

/** Props of {@link MassEntry}. */
export interface MassEntryProps {
  readonly running: RunningCard;
  readonly sentence: string;
  /** What is weighed, for the pad. */
  readonly label: string;
  /** The action's words for a mass written out, such as "Put in 12.50 g". */
  readonly actionWords: (mass: string) => string;
  /** Takes the mass in grams. */
  readonly onMass: (grams: number) => void;
  readonly onCancel: () => void;
  readonly sub?: ReactNode;
  readonly children?: ReactNode;
}

/** A mass typed in the studio's unit; what was typed stays until it is taken or cleared. */
export const MassEntry = (props: MassEntryProps) => {
  const { running, label, onMass } = props;
  const unit = running.write.units.mass;
  const [text, setText] = useTypedText();
  const read = readTypedMass(text, unit);
  const send = (): void => {
    if (read.ok) onMass(read.value);
  };
  return (
    <CardFrame
      running={running}
      sentence={props.sentence}
      number={text === '' ? '–' : text}
      unit={unit}
      state={
        <span role="alert" className="block min-h-12">
          {text !== '' && !read.ok ? <StateMark state="caution" text={read.error} size="desk" /> : null}
        </span>
      }
      sub={props.sub}
      gauge={
        <NumberPad
          label={label}
          value={text}
          onChange={setText}
          onEnter={send}
          unit={unit}
          showValue={false}
        />
      }
      actions={
        <>
          <Button size="terminal" icon="back" onClick={props.onCancel}>
            Back
          </Button>
          <Button kind={read.ok ? 'main' : 'blocked'} size="terminal" className="grow-2" onClick={send}>
            {read.ok ? props.actionWords(running.write.mass(read.value)) : 'Type a mass'}
          </Button>
        </>
      }
    >
      {props.children}
    </CardFrame>
  );
};
