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
  /** Leaves it; absent where the card waits for this mass. */
  readonly onCancel?: () => void;
  /** Another button, at the left of the actions. */
  readonly other?: ReactNode;
  /** Whether nothing at all is a mass too. */
  readonly mayBeNone?: boolean;
  /** What is doubtful about a mass in grams, in one sentence; null when nothing is. */
  readonly doubt?: (grams: number) => string | null;
  readonly sub?: ReactNode;
  readonly children?: ReactNode;
}

/** A mass typed in the studio's unit; what was typed stays until it is taken or cleared. */
export const MassEntry = (props: MassEntryProps) => {
  const { running, label, onMass } = props;
  const unit = running.write.units.mass;
  const [text, setText] = useTypedText();
  const read = readTypedMass(text, unit, props.mayBeNone);
  const doubt = read.ok ? (props.doubt?.(read.value) ?? null) : null;
  const wrong = text !== '' && !read.ok ? read.error : doubt;
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
          {wrong ? <StateMark state="caution" text={wrong} size="desk" /> : null}
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
          {props.other}
          {props.onCancel ? (
            <Button size="terminal" icon="back" onClick={props.onCancel}>
              Back
            </Button>
          ) : null}
          <Button kind={read.ok ? 'main' : 'blocked'} size="terminal" className="grow-2" onClick={send}>
            {!read.ok
              ? 'Type a mass'
              : doubt
                ? `Keep ${running.write.mass(read.value)} as it is`
                : props.actionWords(running.write.mass(read.value))}
          </Button>
        </>
      }
    >
      {props.children}
    </CardFrame>
  );
};
