import type { Studio } from '#shared/contracts/studio.ts';
import type { StudioSettings } from '../models/studio-settings.ts';
import type { Actor } from '../policies/actor.ts';
import { can } from '../policies/policy.ts';
import { studioPolicy } from '../policies/studio.ts';

/** The studio's settings. */
export const presentStudio = (studio: StudioSettings, actor: Actor): Studio => ({
  version: studio.version,
  name: studio.name,
  temperatureUnit: studio.temperatureUnit,
  massUnit: studio.massUnit,
  timeZone: studio.timeZone,
  idleLockS: studio.idleLockS,
  processTables: studio.processTables,
  limits: studio.limits,
  marksPlace: studio.marksPlace,
  pyrometerCheckDays: studio.pyrometerCheckDays,
  abilities: { update: can(studioPolicy.update, actor, undefined) },
});
