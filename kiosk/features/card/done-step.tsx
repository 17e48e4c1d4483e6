import { holdsPieces } from '#shared/domain/pour-card/apply-variance.ts';
import { chargedG } from '#shared/domain/pour-card/card-state.ts';
import { varianceReasonNames, type Departure } from '#shared/domain/pour-card/variance.ts';
import { Button } from '#src/ui/button.tsx';
import { DefinitionList } from '#src/ui/definition-list.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { splitFigure } from '#kiosk/lib/unit-writer.ts';
import { CardFrame } from './card-frame.tsx';
import { lookWords } from './closing-draft.ts';
import type { RunningCard } from './use-running-card.ts';

const figuresOf = ({ state, write }: RunningCard) => {
  const { closing, pour } = state;
  if (!closing) return [];
  return [
    { term: 'Castings', value: write.mass(closing.castMassG) },
    { term: 'Metal in', value: write.mass(chargedG(state)) },
    { term: 'Button', value: write.mass(closing.buttonMassG) },
    { term: 'Spill and loss', value: write.mass(closing.lossMassG) },
    ...(pour && pour.meltC !== null
      ? [{ term: 'Melt at the pour', value: write.temperature(pour.meltC) }]
      : []),
    ...(pour ? [{ term: 'Flask at the pour', value: `about ${write.temperature(pour.flaskC)}` }] : []),
    { term: 'Look', value: lookWords[closing.look] },
  ];
};

const Variance = ({ departure }: { readonly departure: Departure }) => {
  const { sentence, explained } = departure;
  return (
    <li className="border-t-[3px] border-line pt-2">
      {sentence}
      {explained ? (
        <span className="block text-soft">
          {varianceReasonNames[explained.reason]}
          {explained.words === '' ? '' : `: ${explained.words}`}
          {explained.by ? ` Signed by ${explained.by.name}.` : ''}
          {explained.hold ? ' Pieces held.' : ''}
        </span>
      ) : null}
    </li>
  );
};

const Variances = ({ running }: { readonly running: RunningCard }) => {
  const { departures } = running.state;
  if (departures.length === 0) return <StateMark state="ready" text="As the card says" size="terminal" />;
  return (
    <div className="grid gap-3">
      <StateMark
        state="caution"
        text={
          departures.length === 1
            ? 'One departure from the card'
            : `${departures.length} departures from the card`
        }
        size="terminal"
      />
      <div role="region" aria-label="Departures" tabIndex={0} className="max-h-64 overflow-y-auto p-1">
        <ul className="grid gap-2 text-2xl leading-snug">
          {departures.map((departure) => (
            <Variance key={`${departure.kind} ${departure.at}`} departure={departure} />
          ))}
        </ul>
      </div>
    </div>
  );
};

const sentenceOf = ({ card, state, practice }: RunningCard): string => {
  if (practice) return 'The practice is over. Nothing of it is in the book.';
  if (state.step === 'abandoned')
    return `The card has ended as melt ${card.melt.code}. The casting is on hold.`;
  return holdsPieces(state)
    ? `Done. It is melt ${card.melt.code} in the book. Hold the pieces.`
    : `Done. It is melt ${card.melt.code} in the book.`;
};

/** The card is over: where it stands in the melt book, and what went otherwise than planned. */
export const DoneStep = ({ running }: { readonly running: RunningCard }) => {
  const { state, write, practice, leave } = running;
  const isEnded = state.step === 'abandoned';
  const cast = state.closing ? splitFigure(write.mass(state.closing.castMassG)) : null;
  return (
    <CardFrame
      running={running}
      sentence={sentenceOf(running)}
      {...(cast ? { number: cast.figure, unit: cast.unit } : {})}
      state={<Variances running={running} />}
      sub={
        running.waiting > 0
          ? 'Not all of it has reached the server yet. It goes by itself; leave the terminal on.'
          : undefined
      }
      gauge={isEnded ? undefined : <DefinitionList items={figuresOf(running)} size="terminal" />}
      actions={
        <Button kind="main" size="terminal" icon={practice ? 'back' : 'scan'} onClick={leave}>
          {practice ? (practice.kind === 'walk' ? 'End the practice' : 'Begin anew') : 'Next flask'}
        </Button>
      }
    />
  );
};
