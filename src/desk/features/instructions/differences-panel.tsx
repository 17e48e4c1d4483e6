import type { WorkInstruction } from '#shared/domain/instruction/work-instruction.ts';
import { cardStepNames } from '#shared/domain/pour-card/card-step.ts';
import { Panel } from '#src/desk/parts/panel.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { compareInstructions, type StepDifference, type TextDifference } from './compare-instructions.ts';

const signs: Readonly<Record<StepDifference['how'], { readonly mark: string; readonly word: string }>> = {
  added: { mark: '+', word: 'Added' },
  removed: { mark: '−', word: 'Removed' },
  changed: { mark: '≠', word: 'Changed' },
};

const StepLine = ({ difference: { how, step, changes } }: { readonly difference: StepDifference }) => (
  <li className="grid grid-cols-[1.6rem_minmax(0,1fr)] gap-x-3 border-t-2 border-line py-2">
    <span aria-hidden="true" className="text-center text-xl leading-6 font-black">
      {signs[how].mark}
    </span>
    <div>
      <p>
        <strong className="font-black">{signs[how].word}</strong>, {cardStepNames[step.before]}:{' '}
        <span className={how === 'removed' ? 'line-through' : 'font-extrabold'}>{step.sentence}</span>
      </p>
      <ul className="text-[15px] text-soft">
        {changes.map((change) => (
          <li key={change}>{change}</li>
        ))}
      </ul>
    </div>
  </li>
);

const TextLine = ({ difference: { what, before, now } }: { readonly difference: TextDifference }) => (
  <li className="grid grid-cols-[1.6rem_minmax(0,1fr)] gap-x-3 border-t-2 border-line py-2">
    <span aria-hidden="true" className="text-center text-xl leading-6 font-black">
      ≠
    </span>
    <div>
      <p>
        <strong className="font-black">{what}</strong>: <span className="font-extrabold">{now}</span>
      </p>
      <p className="text-[15px] text-soft">Before: {before}</p>
    </div>
  </li>
);

/** Props of {@link DifferencesPanel}. */
export interface DifferencesPanelProps {
  readonly before: { readonly number: number; readonly content: WorkInstruction };
  readonly now: WorkInstruction;
}

/** What differs from another revision: steps added, removed and changed, and the words around them. */
export const DifferencesPanel = ({ before, now }: DifferencesPanelProps) => {
  const { units } = useStudio();
  const { steps, texts } = compareInstructions(before.content, now, units);
  return (
    <Panel title={`Compared with revision ${before.number}`}>
      {steps.length + texts.length === 0 ? (
        <p className="text-soft">Nothing differs.</p>
      ) : (
        <ul>
          {steps.map((difference) => (
            <StepLine key={difference.key} difference={difference} />
          ))}
          {texts.map((difference) => (
            <TextLine key={difference.what} difference={difference} />
          ))}
        </ul>
      )}
    </Panel>
  );
};
