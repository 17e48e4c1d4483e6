import { beforeEach, describe, expect, it, vi } from 'vitest';
import { SerialLines } from './serial-lines.ts';
import type { SerialAccess, SerialFraming, SerialPort } from './serial-port.ts';

/** A port whose bytes a test sends; `noise` ends one stream as a garbled byte does, `unplug` ends the device. */
const fakePort = (usbProductId: number) => {
  let control: ReadableStreamDefaultController<Uint8Array>;
  const stream = (): ReadableStream<Uint8Array> =>
    new ReadableStream({ start: (controller) => void (control = controller) });
  let readable: ReadableStream<Uint8Array> | null = null;
  const opened: SerialFraming[] = [];
  const port: SerialPort = {
    get readable() {
      return readable;
    },
    open: async (framing) => {
      opened.push(framing);
      readable = stream();
      return Promise.resolve();
    },
    close: async () => {
      readable = null;
      return Promise.resolve();
    },
    getInfo: () => ({ usbVendorId: 7, usbProductId }),
  };
  return {
    port,
    opened,
    send: (text: string) => control.enqueue(new TextEncoder().encode(text)),
    noise: () => {
      const broken = control;
      readable = stream();
      broken.error(new Error('BreakError'));
    },
    unplug: () => {
      readable = null;
      control.error(new Error('NetworkError'));
    },
  };
};

const access = (...ports: readonly SerialPort[]) => {
  const listeners: (() => void)[] = [];
  const serial: SerialAccess = {
    getPorts: () => Promise.resolve(ports),
    requestPort: () => (ports[0] ? Promise.resolve(ports[0]) : Promise.reject(new Error('NotFoundError'))),
    addEventListener: (_type, listener) => void listeners.push(listener),
  };
  return { serial, plugIn: () => listeners.forEach((listener) => listener()) };
};

const slow: SerialFraming = { baudRate: 2400, dataBits: 7, parity: 'even', stopBits: 1 };

/** An instrument's reader with the lines it has heard. */
const reader = (instrument: string, serial: SerialAccess | null) => {
  const lines = new SerialLines(instrument, serial);
  const heard: string[] = [];
  lines.hear((line) => heard.push(line));
  return { lines, heard };
};

beforeEach(() => window.localStorage.clear());

describe('SerialLines', () => {
  it('reads the chosen port with its settings, through noise, until the cable is out', async () => {
    const { port, opened, send, noise, unplug } = fakePort(1);
    const { lines, heard } = reader('balance', access(port).serial);
    await lines.choose(slow);
    expect(lines.view()).toMatchObject({ status: 'open', framing: slow });
    expect(opened).toEqual([slow]);
    send('1 g\r\n2 ');
    await vi.waitFor(() => expect(heard).toEqual(['1 g']));
    noise();
    await vi.waitFor(() => expect(port.readable?.locked).toBe(true));
    send('g\r\n3 g\r\n');
    await vi.waitFor(() => expect(heard).toEqual(['1 g', '2 g', '3 g']));
    unplug();
    await vi.waitFor(() => expect(lines.view().status).toBe('lost'));
  });

  it('comes back to the port it knows, and takes none that another instrument reads', async () => {
    const [one, two] = [fakePort(1), fakePort(1)];
    const first = access(one.port, two.port);
    const balance = reader('balance', first.serial);
    await balance.lines.choose(slow);
    window.localStorage.setItem(
      'ladlemark.serial.other',
      window.localStorage.getItem('ladlemark.serial.balance') ?? '',
    );
    const other = reader('other', first.serial);
    await other.lines.resume();
    expect([one.opened.length, two.opened.length]).toEqual([1, 1]);
    one.unplug();
    await vi.waitFor(() => expect(balance.lines.view().status).toBe('lost'));
    first.plugIn();
    await vi.waitFor(() => expect(balance.lines.view().status).toBe('open'));
    one.send('5 g\n');
    await vi.waitFor(() => expect(balance.heard).toEqual(['5 g']));
    expect(other.heard).toEqual([]);
  });

  it('says what is so where there is no port, or it does not open', async () => {
    expect(reader('balance', null).lines.view().status).toBe('unsupported');
    const none = reader('balance', access().serial);
    await none.lines.choose(slow);
    expect(none.lines.view()).toMatchObject({ status: 'closed', problem: null });
    const held = fakePort(2);
    const busy = { ...held.port, open: () => Promise.reject(new Error('InvalidStateError')) };
    const { lines } = reader('balance', access(busy).serial);
    await lines.choose(slow);
    expect(lines.view().problem).toBe('The port does not open: another program may hold it.');
  });

  it('opens its port anew with other settings, and gives it back when told to stop', async () => {
    const { port, opened } = fakePort(3);
    const { lines } = reader('balance', access(port).serial);
    await lines.choose(slow);
    await lines.choose({ ...slow, baudRate: 9600 });
    expect(opened.map(({ baudRate }) => baudRate)).toEqual([2400, 9600]);
    await lines.stop();
    expect(lines.view().status).toBe('closed');
    expect(port.readable).toBeNull();
  });
});
