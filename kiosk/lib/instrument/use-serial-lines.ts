import { useEffect, useEffectEvent, useSyncExternalStore } from 'react';
import { SerialLines, type SerialView } from './serial-lines.ts';

const known = new Map<string, SerialLines>();

/** The one reader of an instrument on this page, by its name, such as `balance`. */
const serialLinesOf = (instrument: string): SerialLines => {
  const lines = known.get(instrument) ?? new SerialLines(instrument);
  known.set(instrument, lines);
  return lines;
};

/** Hears the lines an instrument sends while the screen stands, and says how it stands with its port. */
export const useSerialLines = (
  instrument: string,
  onLine: (line: string) => void,
): { readonly view: SerialView; readonly lines: SerialLines } => {
  const lines = serialLinesOf(instrument);
  const take = useEffectEvent(onLine);
  useEffect(() => {
    void lines.resume();
    return lines.hear((line) => take(line));
  }, [lines]);
  return { view: useSyncExternalStore(lines.subscribe, lines.view), lines };
};
