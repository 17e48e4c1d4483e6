import type { CreationAttributes } from 'sequelize';
import { defaultInstruction } from '#shared/domain/instruction/default-instruction.ts';
import type { WorkInstruction } from '#shared/domain/instruction/work-instruction.ts';
import { defaultProcessTables } from '#shared/domain/studio/process-tables.ts';
import { defaultStudioLimits } from '#shared/domain/studio/studio-limits.ts';
import type { StudioSettings } from '#server/models/studio-settings.ts';
import type { Services } from '#server/services/services.ts';

/** The default instruction with the cautions of its guard only, so that tests of other things need not see to more. */
export const guardOnly: WorkInstruction = {
  ...defaultInstruction,
  steps: defaultInstruction.steps.filter(
    ({ before, when }) => before === 'guard' && when.hazards.length === 0,
  ),
};

/** Builds the studio's settings and its first work instruction, without which nothing runs. */
export const buildStudio = async (
  { models }: Services,
  overrides: Partial<CreationAttributes<StudioSettings>> = {},
): Promise<StudioSettings> => {
  await models.WorkInstructionRevision.create({ number: 1, content: guardOnly, approvedBy: null });
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
