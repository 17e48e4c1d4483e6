import type { UpdateStudioRequest } from '#shared/contracts/studio.ts';
import { AppError } from '../errors.ts';
import type { StudioSettings } from '../models/studio-settings.ts';
import { loadStudio } from '../queries/load-studio.ts';
import type { Services } from '../services/services.ts';

/** Stores the studio's settings, unless someone else stored others since they were read. */
export const updateStudio = (
  services: Services,
  { version, marksPlace, pyrometerCheckDays, ...settings }: UpdateStudioRequest,
): Promise<StudioSettings> =>
  services.sequelize.transaction(async () => {
    const studio = await loadStudio(services, { lock: true });
    if (studio.version !== version) {
      throw new AppError(
        'changed-meanwhile',
        'Someone else changed the settings meanwhile. Load them again, then make your change.',
      );
    }
    return studio.update({
      ...settings,
      marksPlace: marksPlace ?? studio.marksPlace,
      pyrometerCheckDays: pyrometerCheckDays ?? studio.pyrometerCheckDays,
      version: version + 1,
    });
  });
