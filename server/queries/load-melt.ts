import { notFound } from '../errors.ts';
import type { Alloy } from '../models/alloy.ts';
import type { AlloyRevision } from '../models/alloy-revision.ts';
import type { MeltAmendment } from '../models/melt-amendment.ts';
import type { MeltEvent } from '../models/melt-event.ts';
import type { Melt } from '../models/melt.ts';
import type { Models } from '../models/index.ts';
import type { Photograph } from '../models/photograph.ts';
import type { Terminal } from '../models/terminal.ts';
import type { User } from '../models/user.ts';
import type { WorkInstructionRevision } from '../models/work-instruction-revision.ts';
import type { Services } from '../services/services.ts';
import { castingIncludes, type LoadedCasting } from './load-casting.ts';

/** An event with who wrote it and where. */
export type LoadedEvent = MeltEvent & { readonly user: User; readonly terminal: Terminal | null };

/** A melt with all that its line in the book names. */
export type ListedMelt = Melt & {
  readonly casting: LoadedCasting;
  readonly alloyRevision: AlloyRevision & { readonly alloy: Alloy };
  readonly opener: User;
  readonly terminal: Terminal;
};

/** A melt with everything that happened on it. */
export type LoadedMelt = ListedMelt & {
  readonly workInstructionRevision: WorkInstructionRevision;
  readonly events: LoadedEvent[];
  readonly amendments: (MeltAmendment & { readonly user: User })[];
  readonly photographs: (Photograph & { readonly user: User })[];
};

/** What to load with a melt for its line in the book. */
export const meltIncludes = (models: Models) => [
  { model: models.Casting, as: 'casting', include: castingIncludes(models) },
  { model: models.AlloyRevision, as: 'alloyRevision', include: [{ model: models.Alloy, as: 'alloy' }] },
  { model: models.User, as: 'opener' },
  { model: models.Terminal, as: 'terminal' },
];

const eventIncludes = (models: Models) => [
  { model: models.User, as: 'user' },
  { model: models.Terminal, as: 'terminal' },
];

/** The events of a melt, oldest first. */
export const loadEvents = async ({ models }: Services, meltId: string): Promise<LoadedEvent[]> => {
  const events = await models.MeltEvent.findAll({
    where: { meltId },
    include: eventIncludes(models),
    order: [['seq', 'ASC']],
  });
  return events as LoadedEvent[];
};

/** Loads a melt with everything that happened on it. */
export const loadMelt = async (services: Services, id: string): Promise<LoadedMelt> => {
  const { models } = services;
  const melt = await models.Melt.findByPk(id, {
    include: [
      ...meltIncludes(models),
      { model: models.WorkInstructionRevision, as: 'workInstructionRevision' },
      {
        model: models.MeltAmendment,
        as: 'amendments',
        separate: true,
        order: [['id', 'ASC']],
        include: [{ model: models.User, as: 'user' }],
      },
      {
        model: models.Photograph,
        as: 'photographs',
        separate: true,
        order: [['createdAt', 'ASC']],
        include: [{ model: models.User, as: 'user' }],
      },
    ],
  });
  if (!melt) throw notFound('melt');
  return Object.assign(melt, { events: await loadEvents(services, id) }) as LoadedMelt;
};

/** One event with who wrote it and where. */
export const loadEvent = async ({ models }: Services, id: string): Promise<LoadedEvent> => {
  const event = await models.MeltEvent.findByPk(id, { include: eventIncludes(models), rejectOnEmpty: true });
  return event as LoadedEvent;
};
