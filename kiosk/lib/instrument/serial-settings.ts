import type { SerialFraming, SerialPortInfo } from './serial-port.ts';

/** How one instrument is reached from this terminal. */
export interface SerialSettings {
  readonly framing: SerialFraming;
  /** The port that was chosen for it; null until one is. */
  readonly port: SerialPortInfo | null;
}

/** Speeds that instruments are set to, bits per second. */
export const baudRates = [1200, 2400, 4800, 9600, 19200, 38400, 57600, 115200] as const;

/** The ways in which instruments send a character. */
export const framings = {
  '8N1': { dataBits: 8, parity: 'none', stopBits: 1 },
  '7E1': { dataBits: 7, parity: 'even', stopBits: 1 },
  '7O1': { dataBits: 7, parity: 'odd', stopBits: 1 },
  '8E1': { dataBits: 8, parity: 'even', stopBits: 1 },
} as const satisfies Record<string, Omit<SerialFraming, 'baudRate'>>;

/** Until it is set otherwise: 9600 bits per second, 8N1 (common practice, no source). */
const initial: SerialSettings = { framing: { baudRate: 9600, ...framings['8N1'] }, port: null };

const keyOf = (instrument: string): string => `ladlemark.serial.${instrument}`;

const isFraming = (value: unknown): value is SerialFraming =>
  typeof value === 'object' && value !== null && 'baudRate' in value && Number(value.baudRate) > 0;

/** The settings this terminal keeps for an instrument; the initial ones where none are kept or they cannot be read. */
export const readSerialSettings = (instrument: string): SerialSettings => {
  try {
    const kept = JSON.parse(
      window.localStorage.getItem(keyOf(instrument)) ?? 'null',
    ) as SerialSettings | null;
    return kept && isFraming(kept.framing) ? kept : initial;
  } catch {
    return initial;
  }
};

/** Keeps the settings of an instrument at this terminal. */
export const keepSerialSettings = (instrument: string, settings: SerialSettings): void => {
  try {
    window.localStorage.setItem(keyOf(instrument), JSON.stringify(settings));
  } catch {
    // Blocked storage only costs the settings after a reload.
  }
};
