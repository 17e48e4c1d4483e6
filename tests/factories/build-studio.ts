import type { CreationAttributes } from 'sequelize';
import { defaultInstruction } from '#shared/domain/instruction/default-instruction.ts';
import { defaultProcessTables } from '#shared/domain/studio/process-tables.ts';
import { defaultStudioLimits } from '#shared/domain/studio/studio-limits.ts';
import type { StudioSettings } from '#server/models/studio-settings.ts';
import type { Services } from '#server/services/services.ts';

/** Builds the studio's settings and its first work instruction, without which nothing runs. */
export const buildStudio = async (
  { models }: Services,
  overrides: Partial<CreationAttributes<StudioSettings>> = {},
): Promise<StudioSettings> => {
  await models.WorkInstructionRevision.create({ number: 1, content: defaultInstruction, approvedBy: null });
  return models.StudioSettings.create({
    name: 'Studio under test',
    temperatureUnit: 'C',
    massUnit: 'g',
    timeZone: 'Europe/Lisbon',
    idleLockS: 180,
    processTables: defaultProcessTables,
    limits: defaultStudioLimits,
    ...overrides,
  });
};
