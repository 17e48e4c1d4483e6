import type { Flask as FlaskContract } from '#shared/contracts/flask.ts';
import type { ListedFlask } from '../queries/list-flasks.ts';

/** A flask with the casting now in it. */
export const presentFlask = (flask: ListedFlask): FlaskContract => ({
  id: flask.id,
  code: flask.code,
  diameterMm: flask.diameterMm,
  heightMm: flask.heightMm,
  openCastingId: flask.castings[0]?.id ?? null,
});
