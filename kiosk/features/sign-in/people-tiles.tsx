import type { PersonAtTerminal } from '#shared/contracts/person.ts';
import { sentenceOf } from '#src/lib/http.ts';
import { Icon } from '#src/ui/icon.tsx';
import { Notice } from '#src/ui/notice.tsx';
import { Spinner } from '#src/ui/spinner.tsx';

/** Props of {@link PeopleTiles}. */
export interface PeopleTilesProps {
  readonly people: readonly PersonAtTerminal[] | undefined;
  readonly error: Error | null;
  readonly onChoose: (person: PersonAtTerminal) => void;
}

/** The people who may sign in here, a tile each. */
export const PeopleTiles = ({ people, error, onChoose }: PeopleTilesProps) => {
  if (!people && error) return <Notice kind="error" size="terminal" title={sentenceOf(error)} />;
  if (!people) return <Spinner label="Fetching the people" />;
  if (people.length === 0) {
    return (
      <Notice kind="empty" size="terminal" title="Nobody can sign in at a terminal yet.">
        The owner gives people a PIN at the desk, under People.
      </Notice>
    );
  }
  return (
    <ul className="grid grid-cols-2 gap-4">
      {people.map((person) => (
        <li key={person.id} className="grid">
          <button
            type="button"
            onClick={() => onChoose(person)}
            className="flex min-h-28 touch-manipulation items-center gap-5 rounded-[26px] border-[3px] border-ink bg-panel px-6 text-left select-none active:bg-ember-soft"
          >
            <Icon name="person" className="size-12" />
            <span className="grid">
              <span className="text-[30px] leading-tight font-black">{person.name}</span>
              <span className="text-xl text-soft">{person.roles.join(', ')}</span>
            </span>
          </button>
        </li>
      ))}
    </ul>
  );
};
