import type { FieldProblem } from '#shared/contracts/problem.ts';
import type { LotKind } from '#shared/domain/metal/lot.ts';
import type { MassUnit } from '#shared/lib/units.ts';
import type { StudioClock } from '#src/desk/parts/studio-clock.ts';
import type { FormReading } from '#src/desk/parts/form-schema.ts';
import { readMass } from './metal-mass.ts';
import { emptyPart, placeOfPart, readParts, type PartValues } from '#src/desk/parts/read-parts.ts';

/** The form of a lot that is taken in, as it is typed. */
export interface ReceiveValues {
  readonly name: string;
  readonly kind: LotKind | '';
  readonly alloyRevisionId: string;
  readonly parts: PartValues[];
  /** In the studio's unit. */
  readonly mass: string;
  readonly supplier: string;
  readonly supplierReference: string;
  readonly place: string;
  /** A local day, `year-month-day`. */
  readonly receivedOn: string;
  readonly quarantineReason: string;
  readonly confirmed: boolean;
}

/** An empty form, received today. */
export const emptyReceive = (today: string): ReceiveValues => ({
  name: '',
  kind: '',
  alloyRevisionId: '',
  parts: [emptyPart, emptyPart],
  mass: '',
  supplier: '',
  supplierReference: '',
  place: '',
  receivedOn: today,
  quarantineReason: '',
  confirmed: false,
});

/** What a form is read with besides what is typed. */
export interface ReceiveContext {
  readonly key: string;
  readonly unit: MassUnit;
  readonly clock: Pick<StudioClock, 'dayOf' | 'hourOf'>;
  /** The moment of reading, ms since the epoch. */
  readonly nowMs: number;
}

/** Metal received today came now; of another day only the day is known, and noon stands for it. */
const momentOf = (day: string, { clock, nowMs }: ReceiveContext): string | null => {
  if (!/^\d{4}-\d{2}-\d{2}$/.test(day)) return null;
  return new Date(day === clock.dayOf(nowMs) ? nowMs : clock.hourOf(day, 12)).toISOString();
};

/** The form's place for a path of the request. */
const placeOf = (path: string, { parts }: Pick<ReceiveValues, 'parts'>): string => {
  if (path === 'massG') return 'mass';
  return path === 'receivedAt' ? 'receivedOn' : (placeOfPart(path, parts) ?? path);
};

/** How the form of a lot is read: decimal commas, the studio's unit, a local day. */
export const receiveReading = (context: ReceiveContext): FormReading<ReceiveValues> => ({
  placeOf,
  read: (values) => {
    const { parts, mass, receivedOn, alloyRevisionId, kind, ...words } = values;
    const faults: FieldProblem[] = [];
    const massG = readMass(mass, context.unit);
    if (!massG.ok) faults.push({ path: 'mass', message: massG.error });
    const receivedAt = momentOf(receivedOn, context);
    if (receivedAt === null) faults.push({ path: 'receivedOn', message: 'Say on which day it came.' });
    if (kind === '') faults.push({ path: 'kind', message: 'Choose what kind of metal it is.' });
    const { compositionWt, toleranceWt, faults: partFaults } = readParts(parts);
    return {
      request: {
        key: context.key,
        ...words,
        kind,
        compositionWt,
        toleranceWt,
        alloyRevisionId: alloyRevisionId === '' ? null : alloyRevisionId,
        massG: massG.ok ? massG.value : undefined,
        receivedAt,
      },
      faults: [...faults, ...partFaults],
    };
  },
});
