import type { Melt } from '#shared/contracts/melt.ts';
import { cardStepNames, cardSteps } from '#shared/domain/pour-card/card-step.ts';
import { StateMark } from '#src/ui/state-mark.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { answerWords } from './event-words.ts';
import { stepRecords, type StepRecord } from './step-records.ts';

const Line = ({ record: { step, how, entry, answer } }: { readonly record: StepRecord }) => {
  const { clock, units } = useStudio();
  const said = answer ? answerWords(answer, units) : '';
  return (
    <li className="grid grid-cols-[minmax(0,1fr)_auto] gap-x-6 border-t-2 border-line py-2">
      <div>
        <p className="font-extrabold">{step.sentence}</p>
        {said ? <p>{said}</p> : null}
        {how === 'skipped' ? <StateMark state="caution" text="skipped" size="row" /> : null}
      </div>
      <p className="text-right text-[15px] text-soft">
        <time dateTime={entry.occurredAt}>{clock.exactTime(entry.occurredAt)}</time>
        <br />
        {entry.person}
      </p>
    </li>
  );
};

/** The steps of the instruction as they were done on a melt: who, when, and what was answered. */
export const StepsDone = ({ melt }: { readonly melt: Melt }) => {
  const records = stepRecords(melt);
  if (records.length === 0) return <p className="text-soft">None is behind yet.</p>;
  return (
    <div className="grid gap-5">
      {cardSteps.map((part) => {
        const own = records.filter(({ step }) => step.before === part);
        return own.length === 0 ? null : (
          <div key={part}>
            <h3 className="pb-1 font-black">{cardStepNames[part]}</h3>
            <ul>
              {own.map((record) => (
                <Line key={record.step.key} record={record} />
              ))}
            </ul>
          </div>
        );
      })}
    </div>
  );
};
