/** How a serial port is set; by the Web Serial API (WICG), as far as we use it. */
export interface SerialFraming {
  /** Bits per second. */
  readonly baudRate: number;
  readonly dataBits: 7 | 8;
  readonly parity: 'none' | 'even' | 'odd';
  readonly stopBits: 1 | 2;
}

/** What a browser tells about a port: the maker and the model of a USB adapter, nothing of a built-in port. */
export interface SerialPortInfo {
  readonly usbVendorId?: number;
  readonly usbProductId?: number;
}

/** A serial port as the Web Serial API gives it, as far as we use it. */
export interface SerialPort {
  /** Null while the port is closed, and for good once its device is gone. */
  readonly readable: ReadableStream<Uint8Array> | null;
  readonly open: (framing: SerialFraming) => Promise<void>;
  readonly close: () => Promise<void>;
  readonly getInfo: () => SerialPortInfo;
}

/** The browser's way to serial ports: `navigator.serial`. */
export interface SerialAccess {
  /** The ports a person has allowed before. */
  readonly getPorts: () => Promise<readonly SerialPort[]>;
  /** Lets a person choose a port; only on a press of theirs, rejects when they choose none. */
  readonly requestPort: () => Promise<SerialPort>;
  readonly addEventListener: (type: 'connect', listener: () => void) => void;
}

/** The serial ports of this browser; null where it gives none to pages, or the page came over plain HTTP. */
export const serialAccess = (): SerialAccess | null =>
  'serial' in navigator ? (navigator.serial as SerialAccess) : null;
