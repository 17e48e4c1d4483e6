import type { WorkerRole } from '../instruction/instruction-step.ts';
import type { CardStep } from '../pour-card/card-step.ts';
import type { Role } from './role.ts';

/** What an apprentice may do: which alloys, and which parts of a card; null for all of them. */
export interface Apprenticeship {
  readonly alloyIds: readonly string[] | null;
  readonly parts: readonly CardStep[] | null;
}

/** Nothing is withheld. */
export const unlimited: Apprenticeship = { alloyIds: null, parts: null };

/** As what a person with these roles works at the furnace. */
export const workerRoleOf = (roles: readonly Role[]): WorkerRole =>
  roles.includes('apprentice') && !roles.includes('caster') && !roles.includes('owner')
    ? 'apprentice'
    : 'caster';
