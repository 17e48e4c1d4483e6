import { z } from 'zod';
import type { CurvePoint } from '#shared/domain/cooling-curve/curve-point.ts';
import type { CurveVerdict } from '#shared/domain/cooling-curve/judge-curve.ts';
import { optionalWords } from './common.ts';

/** Hands in a melt's cooling curve: points as they were logged, or a table as text. `key` is made once for it. */
export const recordCurveRequest = z
  .object({
    key: z.uuid(),
    instrumentId: z.uuid('That is not an instrument of ours.').nullable().default(null),
    points: z
      .array(
        z.object({
          seconds: z.number().min(0).max(86_400),
          temperatureC: z.number().min(-50, 'No furnace is that cold.').max(2000, 'No furnace is that hot.'),
        }),
      )
      .min(2, 'There are no points in it.')
      .max(5000, 'At most 5000 points: thin them out.')
      .optional(),
    table: z
      .string({ error: 'Choose a file.' })
      .min(1, 'The file is empty.')
      .max(240_000, 'The file is larger than 240 kB: thin it out.')
      .optional(),
    note: optionalWords(500),
  })
  .refine(({ points, table }) => (points === undefined) !== (table === undefined), {
    error: 'Choose a file of times and temperatures.',
    path: ['table'],
  });
/** Hands in a melt's cooling curve. */
export type RecordCurveRequest = z.input<typeof recordCurveRequest>;

/** A melt's cooling curve with what was made of it. */
export interface CoolingCurve {
  readonly id: string;
  readonly source: 'live' | 'table';
  /** With the offset, thinned out to what a picture can show. */
  readonly points: readonly CurvePoint[];
  /** How many there are in all. */
  readonly pointCount: number;
  readonly offsetC: number;
  readonly thermometerC: number;
  readonly verdict: CurveVerdict;
  readonly note: string;
  readonly instrument: string | null;
  readonly person: string;
  readonly at: string;
}

/** The cooling curves of a melt, oldest first, and whether this person may hand one in. */
export interface MeltCurves {
  readonly curves: readonly CoolingCurve[];
  readonly abilities: { readonly record: boolean };
}
