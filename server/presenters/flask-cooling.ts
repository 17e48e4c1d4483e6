import type { FlaskSizeCooling } from '#shared/contracts/flask-cooling.ts';
import { chooseCooling } from '#shared/domain/instrument/choose-cooling.ts';
import { fitFlaskCooling } from '#shared/domain/instrument/fit-flask-cooling.ts';
import { coolingRateFor } from '#shared/domain/pour-card/flask-cooling.ts';
import type { FlaskCooling } from '#shared/domain/studio/process-tables.ts';
import type { LoadedOuting } from '../queries/load-flask-cooling.ts';

/** How flasks cool, size by size: those of the studio's table and those of which something was logged. */
export const presentFlaskCooling = (
  table: readonly FlaskCooling[],
  logged: ReadonlyMap<number, readonly LoadedOuting[]>,
): readonly FlaskSizeCooling[] => {
  const sizes = [...new Set([...table.map(({ diameterMm }) => diameterMm), ...logged.keys()])];
  return sizes
    .sort((a, b) => a - b)
    .map((diameterMm) => {
      const outings = logged.get(diameterMm) ?? [];
      const fit = fitFlaskCooling(outings);
      return {
        diameterMm,
        chosen: chooseCooling(diameterMm, table, fit),
        defaultPerSecond: coolingRateFor(diameterMm, table).perSecond,
        fit,
        outings: outings.map(({ id, flask, at, roomC, readings }) => ({
          id,
          flaskCode: flask.code,
          at: at.toISOString(),
          roomC,
          readings,
        })),
      };
    });
};
