import type { Melt } from '#shared/contracts/melt.ts';
import { openVariances } from '#shared/domain/pour-card/apply-variance.ts';
import { varianceReasonNames, type Departure, type Explanation } from '#shared/domain/pour-card/variance.ts';
import { StateMark } from '#src/ui/state-mark.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';

const signWords = ({ by }: Explanation): string =>
  by ? `Signed by ${by.name}${by.onDevice ? ', PIN checked by the terminal alone' : ''}.` : 'No second sign.';

const Reason = ({ explained }: { readonly explained: Explanation }) => {
  const { clock } = useStudio();
  const { reason, words, hold, at } = explained;
  return (
    <div className="grid gap-1 pl-[26px]">
      <p>
        <strong className="font-extrabold">{varianceReasonNames[reason]}</strong>
        {words ? `: “${words}”` : ''}
      </p>
      <p className="text-[15px] text-soft">
        {signWords(explained)} Given {clock.exactTime(at)}.
      </p>
      {hold ? <StateMark state="stop" text="Pieces held until the owner has looked" size="row" /> : null}
    </div>
  );
};

const Line = ({ departure, isOpen }: { readonly departure: Departure; readonly isOpen: boolean }) => {
  const { clock } = useStudio();
  return (
    <li className="grid gap-1">
      <p className="flex flex-wrap items-baseline justify-between gap-x-6">
        <StateMark state="caution" text={departure.sentence} size="row" />
        <span className="text-[15px] text-soft">{clock.exactTime(departure.at)}</span>
      </p>
      {departure.explained ? <Reason explained={departure.explained} /> : null}
      {isOpen ? (
        <p className="pl-[26px]">
          <StateMark
            state="wait"
            text={departure.isMajor ? 'Wants its reason and a second sign' : 'Wants its reason'}
            size="row"
          />
        </p>
      ) : null}
    </li>
  );
};

/** What went otherwise than the card says: each with its reason, who signed, what is held, and which are still open. */
export const Variances = ({ melt }: { readonly melt: Melt }) => {
  const { departures } = melt.state;
  if (departures.length === 0) return null;
  const open = new Set(openVariances(melt.state, melt.context).map(({ index }) => index));
  return (
    <section aria-label="Departures from the card" className="mb-8 border-y-[3px] border-ink py-4">
      <ul className="grid gap-4">
        {departures.map((departure, index) => (
          <Line
            key={`${departure.kind}-${departure.at}-${departure.sentence}`}
            departure={departure}
            isOpen={open.has(index)}
          />
        ))}
      </ul>
    </section>
  );
};
