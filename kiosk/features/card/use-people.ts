import { useQuery } from '@tanstack/react-query';
import type { PersonAtTerminal } from '#shared/contracts/person.ts';
import { furnaceRoles } from '#shared/domain/people/role.ts';
import { peopleAtTerminalQuery } from '#src/api/people.ts';
import { mayDecide } from '#kiosk/lib/presence.ts';
import type { RunningCard } from './use-running-card.ts';

/** People to choose from. */
export interface People {
  readonly people: readonly PersonAtTerminal[] | undefined;
  readonly error: Error | null;
  /** What is said when there is nobody. */
  readonly nobody: string;
}

const stranger: PersonAtTerminal = { id: 'another-caster', name: 'Another caster', roles: ['caster'] };

const useOthers = ({ practice, person }: RunningCard) => {
  const isPreview = practice?.kind === 'preview';
  const { data, error } = useQuery({ ...peopleAtTerminalQuery, enabled: !isPreview });
  const known = isPreview ? [stranger] : data;
  return { known: known?.filter(({ id }) => id !== person.id), error };
};

/** Those who may sign for what another person does: casters and owners, never whoever does the card. */
export const useSigners = (running: RunningCard): People => {
  const { known, error } = useOthers(running);
  const workerId = running.state.worker?.personId;
  return {
    people: known?.filter((other) => other.id !== workerId && mayDecide(other)),
    error,
    nobody: 'No other caster or owner has a PIN. The owner gives one at the desk, under People.',
  };
};

/** Those who may take a card over. */
export const useSuccessors = (running: RunningCard, onlyCasters: boolean): People => {
  const { known, error } = useOthers(running);
  const isFit = (other: PersonAtTerminal): boolean =>
    onlyCasters ? mayDecide(other) : other.roles.some((role) => furnaceRoles.includes(role));
  return {
    people: known?.filter(isFit),
    error,
    nobody: 'Nobody else may take it over. The owner gives roles and PINs at the desk, under People.',
  };
};
