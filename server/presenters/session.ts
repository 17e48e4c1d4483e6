import type { Session } from '#shared/contracts/session.ts';
import type { StudioSettings } from '../models/studio-settings.ts';
import type { Actor } from '../policies/actor.ts';
import { alloyPolicy } from '../policies/alloy.ts';
import { cardPolicy } from '../policies/casting.ts';
import { personPolicy } from '../policies/person.ts';
import { can } from '../policies/policy.ts';
import { sessionPolicy } from '../policies/session.ts';
import { studioPolicy } from '../policies/studio.ts';
import { terminalPolicy } from '../policies/terminal.ts';

/** Who is signed in, where, and what the application may show them. */
export const presentSession = (actor: Actor, studio: StudioSettings, now: Date): Session => ({
  person: actor.person && { id: actor.person.id, name: actor.person.name, roles: actor.person.roles },
  terminal: actor.terminal && { id: actor.terminal.id, name: actor.terminal.name, bay: actor.terminal.bay },
  via: actor.via,
  studio: {
    name: studio.name,
    units: { temperature: studio.temperatureUnit, mass: studio.massUnit },
    idleLockS: studio.idleLockS,
    timeZone: studio.timeZone,
    marksPlace: studio.marksPlace,
  },
  abilities: {
    seeDesk: can(sessionPolicy.seeDesk, actor, undefined),
    managePeople: can(personPolicy.update, actor, undefined),
    manageTerminals: can(terminalPolicy.makeCode, actor, undefined),
    manageAlloys: can(alloyPolicy.create, actor, undefined),
    editStudio: can(studioPolicy.update, actor, undefined),
    runCards: can(cardPolicy.find, actor, undefined),
  },
  serverTime: now.toISOString(),
});
