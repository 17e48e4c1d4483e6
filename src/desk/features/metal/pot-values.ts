import type { FilledCrucible } from '#shared/contracts/charge.ts';
import type { Alloy } from '#shared/contracts/alloy.ts';
import type { MassUnit } from '#shared/lib/units.ts';
import { toMilligrams } from '#shared/domain/metal/ledger.ts';
import { approvedRevision } from '#src/desk/parts/choose-revision.ts';
import { rootOfParts, type FormReading } from '#src/desk/parts/form-schema.ts';
import {
  emptyPart,
  partsOfAssay,
  placeOfPart,
  readParts,
  type PartValues,
} from '#src/desk/parts/read-parts.ts';
import { readMass, writeExactMass } from './metal-mass.ts';

/** A pot and what it is to become, as it is typed. */
export interface PotValues {
  /** What the pot was filled in from: `alloy:<id>`, `melt:<id>`, or empty for what is typed. */
  readonly from: string;
  readonly mass: string;
  readonly parts: PartValues[];
  readonly alloyRevisionId: string;
}

/** Nothing typed yet. */
export const emptyPot: PotValues = {
  from: '',
  mass: '',
  parts: [emptyPart, emptyPart],
  alloyRevisionId: '',
};

const places: Readonly<Record<string, string>> = { massG: 'mass' };

/** How a pot is read in the studio's unit. */
export const potReading = (unit: MassUnit): FormReading<PotValues> => ({
  placeOf: (path, { parts }) => rootOfParts(placeOfPart(path, parts) ?? places[path] ?? path),
  read: ({ mass, parts, alloyRevisionId }) => {
    const massG = readMass(mass, unit);
    const { compositionWt, toleranceWt, faults } = readParts(parts);
    return {
      request: { massG: massG.ok ? massG.value : undefined, compositionWt, toleranceWt, alloyRevisionId },
      faults: [
        ...(massG.ok ? [] : [{ path: 'mass', message: massG.error }]),
        ...faults,
        ...(alloyRevisionId === ''
          ? [{ path: 'alloyRevisionId', message: 'Choose what it is to become.' }]
          : []),
      ],
    };
  },
});

/** What a pot holds that is of an alloy, or in a crucible by the ledger; null where what is typed stays. */
export const fillPot = (
  from: string,
  { alloys, crucibles }: { readonly alloys: readonly Alloy[]; readonly crucibles: readonly FilledCrucible[] },
  unit: MassUnit,
): (Pick<PotValues, 'parts'> & Partial<Pick<PotValues, 'mass'>>) | null => {
  const [kind, id] = from.split(':');
  if (kind === 'melt') {
    const crucible = crucibles.find(({ melt }) => melt.id === id);
    if (!crucible) return null;
    return { parts: partsOfAssay(crucible), mass: writeExactMass(toMilligrams(crucible.massG), unit) };
  }
  const alloy = alloys.find((each) => each.id === id);
  const revision = alloy && approvedRevision(alloy);
  return revision ? { parts: partsOfAssay(revision) } : null;
};
