import { useState } from 'react';
import { readBalanceLine, type BalanceReading } from '#shared/domain/instrument/read-balance-line.ts';
import type { SerialLines, SerialView } from './serial-lines.ts';
import { useSerialLines } from './use-serial-lines.ts';

/** The balance at a serial port of this terminal. */
export interface Balance {
  /** What its last line says; null while it has sent none, or is not connected. */
  readonly reading: BalanceReading | null;
  /** Why its last line says nothing, in one sentence. */
  readonly fault: string | null;
  readonly view: SerialView;
  readonly lines: SerialLines;
}

/** Reads the balance while the screen stands; only lines that come meanwhile count. */
export const useBalance = (): Balance => {
  const [line, setLine] = useState<string | null>(null);
  const { view, lines } = useSerialLines('balance', setLine);
  const isOpen = view.status === 'open';
  const read = isOpen && line !== null ? readBalanceLine(line) : null;
  return {
    reading: read?.ok ? read.value : null,
    fault: read && !read.ok ? read.error : null,
    view,
    lines,
  };
};
