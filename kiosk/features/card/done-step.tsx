import { useNavigate } from 'react-router-dom';
import { chargedG } from '#shared/domain/pour-card/card-state.ts';
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

const Departures = ({ running }: { readonly running: RunningCard }) => {
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
      <div role="region" aria-label="Departures" tabIndex={0} className="max-h-44 overflow-y-auto p-1">
        <ul className="grid gap-2 text-2xl leading-snug">
          {departures.map(({ sentence, kind, at }) => (
            <li key={`${kind} ${at}`}>{sentence}</li>
          ))}
        </ul>
      </div>
    </div>
  );
};

/** The card is over: where it stands in the melt book, and what went otherwise than planned. */
export const DoneStep = ({ running }: { readonly running: RunningCard }) => {
  const { card, state, write } = running;
  const navigate = useNavigate();
  const isEnded = state.step === 'abandoned';
  const cast = state.closing ? splitFigure(write.mass(state.closing.castMassG)) : null;
  return (
    <CardFrame
      running={running}
      sentence={
        isEnded
          ? `The card has ended as melt ${card.melt.code}. The casting is on hold.`
          : `Done. It is melt ${card.melt.code} in the book.`
      }
      {...(cast ? { number: cast.figure, unit: cast.unit } : {})}
      state={<Departures running={running} />}
      sub={
        running.waiting > 0
          ? 'Not all of it has reached the server yet. It goes by itself; leave the terminal on.'
          : undefined
      }
      gauge={isEnded ? undefined : <DefinitionList items={figuresOf(running)} size="terminal" />}
      actions={
        <Button kind="main" size="terminal" icon="scan" onClick={() => void navigate('/', { replace: true })}>
          Next flask
        </Button>
      }
    />
  );
};
