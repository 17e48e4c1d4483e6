import type { FieldProblem } from '#shared/contracts/problem.ts';
import type { MassUnit } from '#shared/lib/units.ts';
import { rootOfParts, type FormReading } from '#src/desk/parts/form-schema.ts';
import { readMass } from './metal-mass.ts';
import { placeOfPart, readParts, type PartValues } from '#src/desk/parts/read-parts.ts';

/** What a second person types to sign. */
export interface SignValues {
  readonly login: string;
  readonly password: string;
}

/** An act on a mass with its reason, as it is typed. */
export interface MassValues {
  readonly mass: string;
  readonly reason: string;
  readonly sign: SignValues;
}

/** Nothing typed yet. */
export const emptyMass: MassValues = { mass: '', reason: '', sign: { login: '', password: '' } };

/** The name by which an act's contract calls its mass and its reason. */
interface Names {
  readonly mass: 'countedG' | 'rightMassG' | 'massG';
  readonly reason: 'explanation' | 'reason';
  /** Whether a second person may, must or cannot sign. */
  readonly sign: 'may' | 'must' | 'none';
}

const isUnsigned = ({ login, password }: SignValues): boolean => login.trim() === '' && password === '';

/** How an act on a mass is read: `key` is made once for the act, the mass stands in the studio's unit. */
export const massReading = (key: string, unit: MassUnit, names: Names): FormReading<MassValues> => ({
  placeOf: (path) => {
    if (path === names.mass) return 'mass';
    if (path === names.reason) return 'reason';
    if (path === 'countersign.login') return 'sign.login';
    return path.startsWith('countersign') ? 'sign.password' : path;
  },
  read: ({ mass, reason, sign }) => {
    const grams = readMass(mass, unit);
    const isLeftOut = names.sign === 'none' || (names.sign === 'may' && isUnsigned(sign));
    return {
      request: {
        key,
        [names.mass]: grams.ok ? grams.value : undefined,
        [names.reason]: reason,
        ...(isLeftOut ? {} : { countersign: sign }),
      },
      faults: grams.ok ? [] : [{ path: 'mass', message: grams.error }],
    };
  },
});

/** A new assay as it is typed. */
export interface AssayValues {
  readonly parts: PartValues[];
  readonly reason: string;
}

/** How a new assay is read. */
export const assayReading: FormReading<AssayValues> = {
  placeOf: (path, { parts }) => rootOfParts(placeOfPart(path, parts) ?? path),
  read: ({ parts, reason }) => {
    const { compositionWt, toleranceWt, faults } = readParts(parts);
    const read: readonly FieldProblem[] = faults;
    return { request: { kind: 'assay', compositionWt, toleranceWt, reason }, faults: read };
  },
};

/** An act that is words alone, sent as they are typed with `more` beside them. */
export const wordsReading = <Values extends Readonly<Record<string, string>>>(
  more: Readonly<Record<string, string>> = {},
): FormReading<Values> => ({
  placeOf: (path) => path,
  read: (values) => ({ request: { ...more, ...values }, faults: [] }),
});
