import { useCallback, useState } from 'react';
import { useSearchParams } from 'react-router-dom';

/** The temperature the page is read at, °C, and the two ways to change it. */
export interface TemperatureInAddress {
  readonly atC: number;
  /** Moves it on the page only, as often as a hand moves. */
  readonly move: (celsius: number) => void;
  /** Moves it and writes it into the address, once a movement has come to rest. */
  readonly settle: (celsius: number) => void;
}

interface Moved {
  readonly toC: number;
  /** What the address said when it was moved: a different address since then wins. */
  readonly written: string | null;
}

const readParam = (text: string | null): number | null =>
  text !== null && /^-?\d+(\.\d+)?$/.test(text) ? Number(text) : null;

/** The temperature of `?at=<°C>`, or `defaultC`; browsers limit how often the address may change, so a drag waits for rest. */
export const useTemperatureInAddress = (defaultC: number): TemperatureInAddress => {
  const [search, setSearch] = useSearchParams();
  const written = search.get('at');
  const [moved, setMoved] = useState<Moved | null>(null);
  const isCurrent = moved !== null && (moved.written === written || String(moved.toC) === written);
  const move = useCallback((toC: number) => setMoved({ toC, written }), [written]);
  const settle = useCallback(
    (toC: number) => {
      setMoved({ toC, written });
      setSearch(
        (before) => {
          const next = new URLSearchParams(before);
          next.set('at', String(toC));
          return next;
        },
        { replace: true, preventScrollReset: true },
      );
    },
    [setSearch, written],
  );
  return { atC: isCurrent ? moved.toC : (readParam(written) ?? defaultC), move, settle };
};
