import { correctReading } from '#shared/domain/instrument/pyrometer-check.ts';
import {
  fitFlaskCooling,
  type CoolingFit,
  type FlaskOuting,
  type FlaskReading,
} from '#shared/domain/instrument/fit-flask-cooling.ts';
import type { InstrumentReading } from '../models/instrument-reading.ts';
import type { Flask } from '../models/flask.ts';
import type { Services } from '../services/services.ts';

/** One flask's time out of the furnace with the flask it was. */
export interface LoadedOuting extends FlaskOuting {
  readonly flask: Flask;
  readonly at: Date;
}

interface GrowingOuting extends LoadedOuting {
  readonly readings: FlaskReading[];
}

const asOutings = (readings: readonly InstrumentReading[]): readonly LoadedOuting[] => {
  const outings = new Map<string, GrowingOuting>();
  for (const { outingId, flask, roomC, rawC, offsetC, secondsOut, takenAt } of readings) {
    if (outingId === null || !flask || roomC === null || rawC === null || secondsOut === null) continue;
    const outing: GrowingOuting = outings.get(outingId) ?? {
      id: outingId,
      flask,
      roomC,
      at: takenAt,
      readings: [],
    };
    outings.set(outingId, outing);
    outing.readings.push({ secondsOut, temperatureC: correctReading(rawC, offsetC).temperatureC });
  }
  return [...outings.values()];
};

const loadOutings = async ({ models }: Services, diameterMm?: number): Promise<readonly LoadedOuting[]> =>
  asOutings(
    await models.InstrumentReading.findAll({
      include: [
        {
          model: models.Flask,
          as: 'flask',
          required: true,
          ...(diameterMm === undefined ? {} : { where: { diameterMm } }),
        },
      ],
      order: [['id', 'ASC']],
    }),
  );

/** The cooling constant fitted to what was logged of flasks of this diameter; null where nothing tells one. */
export const loadCoolingFit = async (services: Services, diameterMm: number): Promise<CoolingFit | null> =>
  fitFlaskCooling(await loadOutings(services, diameterMm));

/** Everything that was logged of flasks out of the furnace, by their diameter. */
export const loadOutingsBySize = async (
  services: Services,
): Promise<ReadonlyMap<number, readonly LoadedOuting[]>> => {
  const sizes = new Map<number, LoadedOuting[]>();
  for (const outing of await loadOutings(services)) {
    const size = sizes.get(outing.flask.diameterMm) ?? [];
    sizes.set(outing.flask.diameterMm, [...size, outing]);
  }
  return sizes;
};
