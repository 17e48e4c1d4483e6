import type { Melt } from '#shared/contracts/melt.ts';
import { secondsBetween } from '#shared/domain/pour-card/card-handler.ts';
import { formatClock } from '#shared/lib/units.ts';
import { DefinitionList, type Definition } from '#src/ui/definition-list.tsx';
import { quenchWords } from '#src/desk/parts/quench-words.ts';
import { useStudio, type StudioWriting } from '#src/desk/parts/use-studio.ts';

const pourRows = ({ state, context }: Melt, { clock, temperature }: StudioWriting): readonly Definition[] => {
  const { pour } = state;
  if (!pour) return [];
  return [
    { term: 'Poured', value: clock.exactTime(pour.at) },
    { term: 'Out of the furnace before it', value: formatClock(pour.secondsOut) },
    { term: 'Last melt reading', value: pour.meltC === null ? 'none' : temperature(pour.meltC) },
    {
      term: 'Mould, expected by its cooling',
      value: temperature(pour.flaskC),
      note: `at least ${temperature(context.figures.flaskPourLowC)}`,
    },
  ];
};

const quenchRow = ({ state, context }: Melt): readonly Definition[] => {
  if (!state.pour) return [];
  const rule = quenchWords(context.figures.quench);
  return state.quenchedAt
    ? [
        {
          term: 'Quenched',
          value: `${formatClock(secondsBetween(state.pour.at, state.quenchedAt))} after the pour`,
          note: rule,
        },
      ]
    : [{ term: 'Quench', value: rule }];
};

/** How the pour and the quench went. */
export const PourSummary = ({ melt }: { readonly melt: Melt }) => {
  const writing = useStudio();
  const rows = [...pourRows(melt, writing), ...quenchRow(melt)];
  return rows.length === 0 ? (
    <p className="text-soft">Not poured{melt.step === 'abandoned' ? '' : ' yet'}.</p>
  ) : (
    <DefinitionList items={rows} />
  );
};
