import { readLines } from './read-lines.ts';
import type { SerialAccess, SerialFraming, SerialPort, SerialPortInfo } from './serial-port.ts';
import { serialAccess } from './serial-port.ts';
import { keepSerialSettings, readSerialSettings } from './serial-settings.ts';

/** How it stands with an instrument at a serial port; `lost` once it was open and its device went away. */
export interface SerialView {
  readonly status: 'unsupported' | 'closed' | 'opening' | 'open' | 'lost';
  readonly framing: SerialFraming;
  /** Why it could not be opened, in one sentence. */
  readonly problem: string | null;
}

/** Ports some instrument of this page has open: two adapters of one make cannot be told apart otherwise. */
const taken = new WeakSet<SerialPort>();

const isSame = (one: SerialPortInfo, other: SerialPortInfo): boolean =>
  one.usbVendorId === other.usbVendorId && one.usbProductId === other.usbProductId;

const noPort = 'The port does not open: another program may hold it.';

/** One instrument that sends lines of text to a serial port of this terminal; its port stays open across screens. */
export class SerialLines {
  private readonly instrument: string;
  private readonly serial: SerialAccess | null;
  private readonly viewers = new Set<() => void>();
  private readonly hearers = new Set<(line: string) => void>();
  private current: SerialView;
  private reading: AbortController | null = null;
  private ended: Promise<void> = Promise.resolve();

  constructor(instrument: string, serial: SerialAccess | null = serialAccess()) {
    this.instrument = instrument;
    this.serial = serial;
    const { framing } = readSerialSettings(instrument);
    this.current = { status: serial ? 'closed' : 'unsupported', framing, problem: null };
    // A cable that is put back is read again without a word.
    serial?.addEventListener('connect', () => void this.resume());
  }

  /** The view in force; a new object whenever it changes. */
  readonly view = (): SerialView => this.current;

  /** Calls `viewer` on every change of the view until the returned function is called. */
  readonly subscribe = (viewer: () => void): (() => void) => {
    this.viewers.add(viewer);
    return () => this.viewers.delete(viewer);
  };

  /** Calls `hearer` with every line that comes until the returned function is called. */
  readonly hear = (hearer: (line: string) => void): (() => void) => {
    this.hearers.add(hearer);
    return () => this.hearers.delete(hearer);
  };

  /** Lets the person choose a port with these settings, remembers both, and reads it. */
  async choose(framing: SerialFraming): Promise<void> {
    if (!this.serial) return;
    this.change({ framing, problem: null });
    try {
      const port = await this.serial.requestPort();
      // The same port may be chosen again with other settings: it is opened anew.
      await this.stop();
      keepSerialSettings(this.instrument, { framing, port: port.getInfo() });
      await this.read(port);
    } catch {
      // Nothing was chosen: everything stays as it is, but for the settings.
      keepSerialSettings(this.instrument, { ...readSerialSettings(this.instrument), framing });
    }
  }

  /** Reads the port that was chosen before, if it is there; does nothing while one is read. */
  async resume(): Promise<void> {
    const { port: known } = readSerialSettings(this.instrument);
    if (!this.serial || !known || this.isBusy()) return;
    const ports = await this.serial.getPorts();
    const port = ports.find((each) => !taken.has(each) && isSame(each.getInfo(), known));
    if (port && !this.isBusy()) await this.read(port);
  }

  /** Stops reading and gives the port back; resolves once it is closed. */
  stop(): Promise<void> {
    this.reading?.abort();
    return this.ended;
  }

  private isBusy(): boolean {
    return this.current.status === 'opening' || this.current.status === 'open';
  }

  private change(part: Partial<SerialView>): void {
    this.current = { ...this.current, ...part };
    for (const viewer of this.viewers) viewer();
  }

  private async read(port: SerialPort): Promise<void> {
    const reading = new AbortController();
    this.reading = reading;
    taken.add(port);
    this.change({ status: 'opening', problem: null });
    try {
      await port.open(this.current.framing);
    } catch {
      taken.delete(port);
      this.change({ status: 'closed', problem: noPort });
      return;
    }
    this.change({ status: 'open' });
    this.ended = this.readOn(port, reading);
  }

  private async readOn(port: SerialPort, reading: AbortController): Promise<void> {
    await readLines(port, (line) => this.tell(line), reading.signal);
    // A device that is gone cannot be closed any more.
    await port.close().catch(() => undefined);
    taken.delete(port);
    if (this.reading === reading) this.change({ status: reading.signal.aborted ? 'closed' : 'lost' });
  }

  private tell(line: string): void {
    for (const hearer of this.hearers) hearer(line);
  }
}
