import { useState } from 'react';
import { refuse, type Result } from '#shared/lib/result.ts';
import type { Grams, MassUnit } from '#shared/lib/units.ts';
import { useBalance, type Balance } from '#kiosk/lib/instrument/use-balance.ts';
import { splitFigure, type UnitWriter } from '#kiosk/lib/unit-writer.ts';
import { usePastedText } from '#kiosk/lib/use-pasted-text.ts';
import { useScanner } from '#kiosk/lib/use-scanner.ts';
import { useTypedText } from '#kiosk/lib/use-typed-text.ts';
import { readTypedMass, readWeighedLine, stillMoving } from './typed-mass.ts';

/** A mass as it comes in: from the pad, a paste, a balance that types, or one at the serial port. */
export interface EnteredMass {
  /** What the screen shows as its number; null while there is nothing. */
  readonly shown: string | null;
  /** What the pad holds. */
  readonly text: string;
  readonly setText: (text: string) => void;
  /** The mass, or why there is none, in one sentence. */
  readonly read: Result<Grams>;
  readonly balance: Balance;
}

type Taken = { readonly line: string; readonly read: Result<Grams> };

/** A unit typed behind the figure counts as well, as slow balances and people write it. */
const readTyped = (text: string, unit: MassUnit, mayBeNone: boolean): Result<Grams> => {
  const typed = readTypedMass(text, unit, mayBeNone);
  const line = typed.ok || !/[a-z]$/i.test(text) ? typed : readWeighedLine(text, unit);
  return line.ok ? line : typed;
};

/** The live balance counts as long as nothing is typed. */
const readLive = ({ reading, fault }: Balance): Result<Grams> | null => {
  if (fault !== null) return refuse(fault);
  if (!reading) return null;
  if (!reading.isStable) return refuse(stillMoving);
  return reading.massG > 0 ? { ok: true, value: reading.massG } : refuse('Put the metal on the pan.');
};

/**
 * Collects a mass. `onLabel` is given whatever a scanner types that is a code and no mass, and says whether it took it;
 * `mayBeNone` lets nought be typed.
 */
export const useEnteredMass = (
  write: UnitWriter,
  onLabel: (code: string) => boolean,
  mayBeNone = false,
): EnteredMass => {
  const unit = write.units.mass;
  const [text, setTyped] = useTypedText();
  const [taken, setTaken] = useState<Taken | null>(null);
  const balance = useBalance();
  const setText = (next: string): void => {
    setTaken(null);
    setTyped(next);
  };
  const takeLine = (line: string): void => {
    // The keys of the line went to the pad as well, one by one.
    setTyped('');
    setTaken({ line, read: readWeighedLine(line, unit) });
  };
  usePastedText(takeLine);
  useScanner((line) => {
    if (!onLabel(line)) takeLine(line);
    return true;
  });
  const figureOf = (grams: Grams): string => splitFigure(write.mass(grams)).figure;
  const common = { text, setText, balance };
  if (text !== '') return { ...common, shown: text, read: readTyped(text, unit, mayBeNone) };
  if (taken) {
    const shown = taken.read.ok ? figureOf(taken.read.value) : '–';
    return { ...common, shown, read: taken.read };
  }
  const shown = balance.reading ? figureOf(balance.reading.massG) : null;
  return { ...common, shown, read: readLive(balance) ?? refuse('Type a mass.') };
};
