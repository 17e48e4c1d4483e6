import type { MeltEvent } from '#shared/contracts/card.ts';
import type { Melt } from '#shared/contracts/melt.ts';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { handOvers } from './step-records.ts';

const roleWords = ({ event }: MeltEvent): string =>
  'worker' in event && event.worker?.role === 'apprentice' ? ', as an apprentice' : '';

/** Who had the card, one after another, where and from when. */
export const HandOvers = ({ melt }: { readonly melt: Melt }) => {
  const { clock } = useStudio();
  return (
    <ol>
      {handOvers(melt).map((entry) => (
        <li
          key={entry.key}
          className="flex flex-wrap items-baseline justify-between gap-x-6 border-t-2 border-line py-2"
        >
          <span>
            <strong className="font-extrabold">{entry.person}</strong>
            {roleWords(entry)}
            {entry.terminal ? `, ${entry.terminal}` : ''}
          </span>
          <span className="text-[15px] text-soft">from {clock.exactTime(entry.occurredAt)}</span>
        </li>
      ))}
    </ol>
  );
};
