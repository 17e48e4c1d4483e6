import { AppError } from '../errors.ts';
import type { StudioSettings } from '../models/studio-settings.ts';
import type { Services } from '../services/services.ts';

/** The studio's settings; refused while the studio has none yet. */
export const loadStudio = async (
  { models }: Services,
  options: { readonly lock?: boolean } = {},
): Promise<StudioSettings> => {
  const studio = await models.StudioSettings.findByPk(1, options);
  if (!studio) throw new AppError('not-ready', 'The studio has not been set up yet.');
  return studio;
};
