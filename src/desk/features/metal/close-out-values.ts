import type { MassUnit } from '#shared/lib/units.ts';
import type { FormReading } from '#src/desk/parts/form-schema.ts';
import { readMass, writeExactMass } from './metal-mass.ts';
import { toMilligrams } from '#shared/domain/metal/ledger.ts';

/** What became of the metal in a crucible, as it is typed. */
export interface CloseOutValues {
  readonly button: string;
  readonly loss: string;
  readonly note: string;
}

/** A pot that was let freeze: all of it is button until someone says otherwise. */
export const allButton = (massG: number, unit: MassUnit): CloseOutValues => ({
  button: writeExactMass(toMilligrams(massG), unit),
  loss: '0',
  note: '',
});

const places: Readonly<Record<string, string>> = { buttonG: 'button', lossG: 'loss' };

/** How a close-out is read in the studio's unit. */
export const closeOutReading = (unit: MassUnit): FormReading<CloseOutValues> => ({
  placeOf: (path) => places[path] ?? path,
  read: ({ button, loss, note }) => {
    const [buttonG, lossG] = [readMass(button, unit), readMass(loss, unit)];
    return {
      request: {
        buttonG: buttonG.ok ? buttonG.value : undefined,
        lossG: lossG.ok ? lossG.value : undefined,
        note,
      },
      faults: [
        ...(buttonG.ok ? [] : [{ path: 'button', message: buttonG.error }]),
        ...(lossG.ok ? [] : [{ path: 'loss', message: lossG.error }]),
      ],
    };
  },
});

/** What is left for the castings, mg, below nought where too much is named; null while something cannot be read. */
export const castingsMg = (
  { button, loss }: CloseOutValues,
  massG: number,
  unit: MassUnit,
): number | null => {
  const [buttonG, lossG] = [readMass(button, unit), readMass(loss, unit)];
  if (!buttonG.ok || !lossG.ok) return null;
  return toMilligrams(massG) - toMilligrams(buttonG.value) - toMilligrams(lossG.value);
};
