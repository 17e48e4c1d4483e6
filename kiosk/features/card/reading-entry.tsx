import { useState, type ReactNode } from 'react';
import { parseDecimal } from '#shared/lib/decimal.ts';
import type { ReadingVerdict } from '#shared/domain/pour-card/judge-reading.ts';
import { Button } from '#src/ui/button.tsx';
import { NumberPad } from '#src/ui/number-pad.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { mayDecide } from '#kiosk/lib/presence.ts';
import { useTypedText } from '#kiosk/lib/use-typed-text.ts';
import { CardFrame } from './card-frame.tsx';
import type { RunningCard } from './use-running-card.ts';

/** Props of {@link ReadingEntry}. */
export interface ReadingEntryProps {
  readonly running: RunningCard;
  readonly sentence: string;
  readonly label: string;
  /** Judges a number typed in the studio's unit. */
  readonly judge: (typed: number) => ReadingVerdict;
  /** Takes the temperature in °C; `confirmed` when a person stood by a doubtful one. */
  readonly onReading: (celsius: number, confirmed: boolean) => void;
  /** Leaves it; absent where the card waits for this reading. */
  readonly onCancel?: () => void;
  /** Another button, at the left of the actions. */
  readonly other?: ReactNode;
  readonly sub?: ReactNode;
  /** Whether a doubtful reading may be stood by; a caster or the owner unless told otherwise. */
  readonly mayConfirm?: boolean;
}

type Doubt = Exclude<ReadingVerdict, { readonly kind: 'accept' }>;

interface DoubtActionsProps {
  readonly doubt: Doubt;
  readonly mayConfirm: boolean;
  readonly onReading: ReadingEntryProps['onReading'];
  readonly onAgain: () => void;
}

const DoubtActions = ({ doubt, mayConfirm, onReading, onAgain }: DoubtActionsProps) => (
  <>
    <Button
      size="terminal"
      icon="pad"
      kind={doubt.kind === 'refuse' && !doubt.meant ? 'main' : 'plain'}
      onClick={onAgain}
    >
      Type again
    </Button>
    {doubt.kind === 'refuse' && doubt.meant ? (
      <MeantButton meant={doubt.meant} onReading={onReading} />
    ) : null}
    {doubt.kind === 'question' ? (
      mayConfirm ? (
        <Button size="terminal" kind="main" className="grow-2" onClick={() => onReading(doubt.celsius, true)}>
          Yes, it is right
        </Button>
      ) : (
        <Button size="terminal" kind="blocked" className="grow-2">
          A caster or the owner has to confirm this
        </Button>
      )
    ) : null}
  </>
);

interface MeantButtonProps {
  readonly meant: { readonly celsius: number; readonly label: string };
  readonly onReading: ReadingEntryProps['onReading'];
}

const MeantButton = ({ meant, onReading }: MeantButtonProps) => (
  <Button size="terminal" kind="main" className="grow-2" onClick={() => onReading(meant.celsius, false)}>
    I meant {meant.label}
  </Button>
);

/** A temperature typed in the studio's unit: refused or questioned before it is stored, and kept while it is. */
export const ReadingEntry = (props: ReadingEntryProps) => {
  const { running, sentence, label, judge, onReading, onCancel } = props;
  const [text, setText] = useTypedText();
  const [doubt, setDoubt] = useState<Doubt | null>(null);
  const { degreeUnit } = running.write;
  const typed = parseDecimal(text);
  const send = (): void => {
    if (!typed.ok) return;
    const verdict = judge(typed.value);
    if (verdict.kind === 'accept') onReading(verdict.celsius, false);
    else setDoubt(verdict);
  };
  const change = (next: string): void => {
    setDoubt(null);
    setText(next);
  };
  const wrong = doubt?.sentence ?? (text !== '' && !typed.ok ? typed.error : null);
  return (
    <CardFrame
      running={running}
      sentence={sentence}
      number={text === '' ? '–' : text}
      unit={degreeUnit}
      state={
        <span role="alert" className="block min-h-12">
          {wrong ? <StateMark state="caution" text={wrong} size="terminal" /> : null}
        </span>
      }
      sub={props.sub}
      gauge={
        <NumberPad
          label={label}
          value={text}
          onChange={change}
          onEnter={send}
          unit={degreeUnit}
          maxLength={6}
          showValue={false}
        />
      }
      actions={
        doubt ? (
          <DoubtActions
            doubt={doubt}
            mayConfirm={props.mayConfirm ?? mayDecide(running.person)}
            onReading={onReading}
            onAgain={() => change('')}
          />
        ) : (
          <>
            {props.other}
            {onCancel ? (
              <Button size="terminal" icon="back" onClick={onCancel}>
                Back
              </Button>
            ) : null}
            <Button kind={typed.ok ? 'main' : 'blocked'} size="terminal" className="grow-2" onClick={send}>
              {typed.ok ? `Take ${text} ${degreeUnit}` : 'Type a temperature'}
            </Button>
          </>
        )
      }
    />
  );
};
