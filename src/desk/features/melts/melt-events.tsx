import type { Amendment, Melt } from '#shared/contracts/melt.ts';
import type { MeltEvent } from '#shared/contracts/card.ts';
import { formatClock } from '#shared/lib/units.ts';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { eventWords, recordedLateS } from './event-words.ts';
import { sentenceOfStep } from './step-records.ts';

/** A remark added later, with who and when. */
export const AmendmentNote = ({ amendment }: { readonly amendment: Amendment }) => {
  const { clock } = useStudio();
  return (
    <p className="border-l-[5px] border-iron py-0.5 pl-4">
      <span className="font-extrabold">{amendment.note}</span>
      <span className="block text-[15px] text-soft">
        Added by {amendment.person}, {clock.dayAndTime(amendment.at)}
      </span>
    </p>
  );
};

interface EntryProps {
  readonly entry: MeltEvent;
  readonly amendments: readonly Amendment[];
  /** The sentence of a step by its key. */
  readonly sentenceOf: (key: string) => string;
}

const Entry = ({ entry, amendments, sentenceOf }: EntryProps) => {
  const { clock, units } = useStudio();
  const late = recordedLateS(entry.occurredAt, entry.recordedAt);
  const where = entry.terminal ? `${entry.person}, ${entry.terminal}` : entry.person;
  return (
    <li className="grid grid-cols-[2.2rem_5.2rem_minmax(0,1fr)] gap-x-3 border-t-2 border-line py-2.5">
      <span className="text-right font-extrabold text-soft">{entry.seq}</span>
      <time dateTime={entry.occurredAt} className="font-extrabold">
        {clock.exactTime(entry.occurredAt)}
      </time>
      <div className="grid gap-2">
        <p className="flex flex-wrap justify-between gap-x-6">
          <span className="font-extrabold">{eventWords(entry.event, units, sentenceOf)}</span>
          <span className="text-[15px] text-soft">{where}</span>
        </p>
        {late === null ? null : (
          <p className="text-[15px] text-soft">
            Recorded {formatClock(late)} later, at {clock.exactTime(entry.recordedAt)}.
          </p>
        )}
        {amendments.map((amendment) => (
          <AmendmentNote key={amendment.at} amendment={amendment} />
        ))}
      </div>
    </li>
  );
};

/** Everything that happened on a melt, in order, each entry with the remarks made on it since. */
export const MeltEvents = ({ melt }: { readonly melt: Melt }) => (
  <ol>
    {melt.events.map((entry) => (
      <Entry
        key={entry.key}
        entry={entry}
        sentenceOf={sentenceOfStep(melt)}
        amendments={melt.amendments.filter(({ seq }) => seq === entry.seq)}
      />
    ))}
  </ol>
);
