import type { KeyboardEvent } from 'react';
import { cx } from '#src/ui/cx.ts';
import { Icon, type IconName } from '#src/ui/icon.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { stepLine } from './instruction-sheet.tsx';
import { StepFields } from './step-fields.tsx';
import { readStep, type StepValues } from './step-values.ts';
import type { Arranging } from './use-arranging.ts';

/** Props of {@link StepCard}. */
export interface StepCardProps {
  readonly step: StepValues;
  readonly index: number;
  /** Sentences by field of the step. */
  readonly fieldFaults: ReadonlyMap<string, string>;
  /** What keeps the step from being approved as it stands. */
  readonly faults: readonly string[];
  readonly arranging: Arranging;
}

interface ToolProps {
  readonly id?: string;
  readonly name: string;
  readonly icon?: IconName;
  readonly onPress: () => void;
}

const Tool = ({ id, name, icon, onPress }: ToolProps) => (
  <button
    type="button"
    id={id}
    onClick={onPress}
    className="inline-flex min-h-10 min-w-10 items-center justify-center rounded-lg px-1.5 text-[15px] font-extrabold underline decoration-2 underline-offset-4"
  >
    {icon ? <Icon name={icon} className="size-5" /> : null}
    <span className={icon ? 'sr-only' : undefined}>{name}</span>
  </button>
);

const Tools = ({ step, index, arranging }: Pick<StepCardProps, 'step' | 'index' | 'arranging'>) => (
  <div
    role="group"
    aria-label={`Step ${index + 1}: ${step.sentence || 'new step'}`}
    className="flex flex-wrap items-center justify-end"
  >
    <Tool id={`up-${step.key}`} name="Move up" icon="up" onPress={() => arranging.move(index, 'up')} />
    <Tool
      id={`down-${step.key}`}
      name="Move down"
      icon="down"
      onPress={() => arranging.move(index, 'down')}
    />
    <Tool name="Copy" onPress={() => arranging.duplicate(index)} />
    <Tool name="Remove" onPress={() => arranging.remove(index)} />
  </div>
);

/** One step of the draft: its words, what is wrong with it, and, opened, its fields. Alt with an arrow key moves it. */
export const StepCard = ({ step, index, fieldFaults, faults, arranging }: StepCardProps) => {
  const { units } = useStudio();
  const isOpen = arranging.openKey === step.key;
  const sentences = isOpen ? faults : [...fieldFaults.values(), ...faults];
  const moveByKey = (event: KeyboardEvent): void => {
    if (!event.altKey || (event.key !== 'ArrowUp' && event.key !== 'ArrowDown')) return;
    event.preventDefault();
    arranging.move(index, event.key === 'ArrowUp' ? 'up' : 'down');
  };
  return (
    <li
      onKeyDown={moveByKey}
      className={cx(
        'rounded-2xl border-2 bg-panel',
        fieldFaults.size + faults.length > 0 ? 'border-ember' : isOpen ? 'border-ink' : 'border-line',
      )}
    >
      <div className="grid grid-cols-[1.7rem_minmax(0,1fr)] items-start gap-x-2.5 px-3 py-2 sm:grid-cols-[1.7rem_minmax(0,1fr)_auto]">
        <span className="pt-1.5 text-right font-extrabold text-soft">{index + 1}</span>
        <div className="min-w-0 py-1">
          <button
            type="button"
            id={`step-${step.key}`}
            aria-expanded={isOpen}
            onClick={() => arranging.toggle(step.key)}
            className="rounded-md text-left font-extrabold break-words"
          >
            {step.sentence || 'A new step'}
          </button>
          <p className="text-[15px] text-soft">{stepLine(readStep(step, units).step, units)}</p>
          {sentences.map((sentence) => (
            <p key={sentence} className="pt-1">
              <StateMark state="stop" text={sentence} size="row" />
            </p>
          ))}
        </div>
        <div className="col-start-2 sm:col-start-3">
          <Tools step={step} index={index} arranging={arranging} />
        </div>
      </div>
      {isOpen ? (
        <StepFields
          step={step}
          faults={fieldFaults}
          onChange={(change) => arranging.change(index, change)}
          onTakeToPart={(part) => arranging.takeToPart(index, part)}
        />
      ) : null}
    </li>
  );
};
