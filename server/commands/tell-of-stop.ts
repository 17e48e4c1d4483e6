import type { Melt } from '../models/melt.ts';
import type { AtTerminal } from '../policies/actor.ts';
import type { Services } from '../services/services.ts';
import { tellOwners } from './tell-owners.ts';

/** Tells the owners that work was stopped on a card: why, who, where. It is never waited for, and its failure is only logged. */
export const tellOfStop = (services: Services, { person, terminal }: AtTerminal, melt: Melt): void => {
  const stop = melt.state.departures.findLast(({ kind }) => kind === 'work-stopped');
  const told = tellOwners(services, {
    subject: `Work is stopped at ${terminal.name}, ${terminal.bay}`,
    text: `${stop?.sentence ?? 'Work was stopped.'} ${person.name} stopped melt ${melt.code} at ${terminal.name}, ${terminal.bay}. The card waits until someone resumes or ends it there; the melt book at the desk shows it.`,
  });
  told.catch((error: unknown) => {
    services.logger.warn('The owners could not be told that work was stopped.', {
      melt: melt.code,
      error: String(error),
    });
  });
};
