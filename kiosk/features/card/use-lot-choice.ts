import { useRef, useState } from 'react';
import type { Lot } from '#shared/contracts/lot.ts';
import { parseLotCode } from '#shared/lib/codes.ts';
import { findLot } from '#src/api/lots.ts';
import { sentenceOf, UnreachableError } from '#src/lib/http.ts';
import { refusalOfLot } from './refusal-of-lot.ts';
import type { LotCharge } from './use-lot-charge.ts';

/** Where the choice of a lot stands. */
export type LotChoice =
  | { readonly kind: 'none' }
  | { readonly kind: 'scanning' }
  | { readonly kind: 'asking'; readonly code: string; readonly isScanning: boolean }
  | { readonly kind: 'refused'; readonly code: string; readonly sentence: string }
  | { readonly kind: 'chosen'; readonly lot: Lot };

const unknownHere =
  'The server cannot be reached, and this lot is not known here. Choose one from the list, or wait.';

/** Looks a lot up as it is now; without the server, as it was last seen. */
const lookUp = async (code: string, { lots }: LotCharge): Promise<Lot> => {
  try {
    return await findLot(code);
  } catch (error) {
    const seen = lots.find((lot) => lot.code === code);
    if (error instanceof UnreachableError && seen) return seen;
    throw error;
  }
};

/** Chooses a lot by a scanned, typed or touched code; one that may not go in is refused in a sentence. */
export const useLotChoice = (charge: LotCharge) => {
  const [choice, setChoice] = useState<LotChoice>({ kind: 'none' });
  // An answer that comes after another code was read is of no interest any more.
  const latest = useRef(0);
  const choose = async (text: string, isScanning: boolean): Promise<void> => {
    const turn = (latest.current += 1);
    const end = (next: LotChoice): void => {
      if (turn === latest.current) setChoice(next);
    };
    const parsed = parseLotCode(text);
    if (!parsed.ok) return end({ kind: 'refused', code: text, sentence: parsed.error });
    const code = parsed.value;
    end({ kind: 'asking', code, isScanning });
    try {
      const lot = await lookUp(code, charge);
      const sentence = refusalOfLot(lot, charge);
      end(sentence === null ? { kind: 'chosen', lot } : { kind: 'refused', code, sentence });
    } catch (error) {
      const sentence = error instanceof UnreachableError ? unknownHere : sentenceOf(error);
      end({ kind: 'refused', code, sentence });
    }
  };
  const leave = (next: LotChoice): void => {
    latest.current += 1;
    setChoice(next);
  };
  return {
    choice,
    /** Takes a code from anywhere but the scanning screen, which is then not opened unless the lot is refused. */
    choose: (text: string): void => void choose(text, false),
    /** Takes a code from the scanning screen. */
    chooseScanned: (text: string): void => void choose(text, true),
    scan: () => leave({ kind: 'scanning' }),
    clear: () => leave({ kind: 'none' }),
  };
};
