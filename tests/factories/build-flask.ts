import type { CreationAttributes } from 'sequelize';
import { buildFlaskCode } from '#shared/lib/codes.ts';
import type { Flask } from '#server/models/flask.ts';
import type { Services } from '#server/services/services.ts';
import { nextNumber } from './sequence.ts';

/** Builds a flask with a valid code. */
export const buildFlask = (
  { models }: Services,
  overrides: Partial<CreationAttributes<Flask>> = {},
): Promise<Flask> =>
  models.Flask.create({ code: buildFlaskCode(nextNumber()), diameterMm: 89, heightMm: 102, ...overrides });
