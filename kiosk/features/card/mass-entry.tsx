import { useState, type ReactNode } from 'react';
import type { WeighingVerdict } from '#shared/domain/pour-card/judge-weighing.ts';
import type { Grams } from '#shared/lib/units.ts';
import { Button } from '#src/ui/button.tsx';
import { NumberPad } from '#src/ui/number-pad.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { InstrumentLink } from '#kiosk/lib/instrument/instrument-link.tsx';
import { CardFrame } from './card-frame.tsx';
import { MassDoubt } from './mass-doubt.tsx';
import { useEnteredMass, type EnteredMass } from './use-entered-mass.ts';
import type { RunningCard } from './use-running-card.ts';

/** Props of {@link MassEntry}. */
export interface MassEntryProps {
  readonly running: RunningCard;
  readonly sentence: string;
  /** What is weighed, for the pad. */
  readonly label: string;
  /** The action's words for a mass written out, such as "Put in 12.50 g". */
  readonly actionWords: (mass: string) => string;
  /** Judges a mass before it is taken; without it any plausible mass is. */
  readonly judge?: (grams: Grams) => WeighingVerdict;
  /** Takes the mass in grams. */
  readonly onMass: (grams: Grams) => void;
  /** Takes the code on a label that is scanned meanwhile, and says whether it did. */
  readonly onLabel?: (code: string) => boolean;
  /** Leaves it; absent where the card waits for this mass. */
  readonly onCancel?: () => void;
  /** Another button, at the left of the actions. */
  readonly other?: ReactNode;
  /** Whether nothing at all is a mass too. */
  readonly mayBeNone?: boolean;
  /** What is remarkable about a mass in grams that may be taken all the same; null when nothing is. */
  readonly remark?: (grams: Grams) => string | null;
  readonly sub?: ReactNode;
  /** Shown in place of the pad while a mass is questioned. */
  readonly picture?: ReactNode;
  readonly children?: ReactNode;
}

/** A mass in doubt, and what was weighed. */
export interface Doubt {
  readonly grams: Grams;
  readonly verdict: Exclude<WeighingVerdict, { readonly kind: 'accept' }>;
}

const MassState = ({
  entered: { shown, read, balance },
  remark,
}: {
  readonly entered: EnteredMass;
  readonly remark: string | null;
}) => {
  const words = shown !== null && !read.ok ? read.error : (remark ?? balance.fault);
  return words === null ? null : <StateMark state="caution" text={words} size="desk" />;
};

/** A mass in the studio's unit, typed, pasted or from a balance; what was typed stays until it is taken or cleared. */
export const MassEntry = (props: MassEntryProps) => {
  const { running, label, onMass, judge, onLabel } = props;
  const [doubt, setDoubt] = useState<Doubt | null>(null);
  const entered = useEnteredMass(running.write, onLabel ?? (() => false), props.mayBeNone);
  const { text, setText, read, balance } = entered;
  const unit = running.write.units.mass;
  const take = (grams: Grams): void => {
    const verdict = judge?.(grams) ?? { kind: 'accept' };
    if (verdict.kind === 'accept') onMass(grams);
    else setDoubt({ grams, verdict });
  };
  const send = (): void => {
    if (read.ok) take(read.value);
  };
  const again = (): void => {
    setDoubt(null);
    setText('');
  };
  const remark = read.ok ? (props.remark?.(read.value) ?? null) : null;
  const actionWords = remark === null ? props.actionWords : (mass: string) => `Keep ${mass} as it is`;
  if (doubt) return <MassDoubt {...props} doubt={doubt} onAgain={again} onTake={onMass} />;
  return (
    <CardFrame
      running={running}
      sentence={props.sentence}
      number={entered.shown ?? '–'}
      unit={unit}
      state={
        <span role="alert" className="block min-h-12">
          <MassState entered={entered} remark={remark} />
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
            {read.ok ? actionWords(running.write.mass(read.value)) : 'Type a mass'}
          </Button>
        </>
      }
    >
      <div className="grid gap-5">
        {props.children}
        <InstrumentLink name="balance" view={balance.view} lines={balance.lines} />
      </div>
    </CardFrame>
  );
};
