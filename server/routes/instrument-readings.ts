import { pushReadingsRequest } from '#shared/contracts/instrument-reading.ts';
import { pushReadings } from '../commands/push-readings.ts';
import { readingPolicy } from '../policies/instrument.ts';
import { presentReading } from '../presenters/instrument.ts';
import { defineRoute } from './define-route.ts';

const push = defineRoute({
  method: 'post',
  path: '/api/instrument-readings',
  policy: readingPolicy.push,
  body: pushReadingsRequest,
  status: 201,
  act: async ({ actor, services, body }) => {
    const { instrument, readings, again } = await pushReadings(services, actor, body);
    const newest = readings.reduce((best, each) => (each.takenAt >= best.takenAt ? each : best));
    return {
      instrumentId: instrument.id,
      recorded: readings.length,
      again,
      latest: presentReading(newest, services.now()),
    };
  },
});

export const instrumentReadingRoutes = [push];
