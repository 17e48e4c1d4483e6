import type { SerialPort } from './serial-port.ts';
import { splitLines } from './split-lines.ts';

/**
 * Reads an open port line by line until `signal` is aborted or the device is gone; never rejects. A garbled byte ends
 * one stream of a port, which then offers the next: reading goes on there.
 */
export const readLines = async (
  port: SerialPort,
  onLine: (line: string) => void,
  signal: AbortSignal,
): Promise<void> => {
  const push = splitLines(onLine);
  // Of one byte for each character, so that no byte is ever an error.
  const decoder = new TextDecoder('latin1');
  let last: ReadableStream<Uint8Array> | null = null;
  while (port.readable && port.readable !== last && !signal.aborted) {
    last = port.readable;
    const reader = last.getReader();
    const cancel = (): void => void reader.cancel().catch(() => undefined);
    signal.addEventListener('abort', cancel, { once: true });
    try {
      for (let part = await reader.read(); !part.done; part = await reader.read())
        push(decoder.decode(part.value));
    } catch {
      // Told apart by what the port offers next: another stream after noise, none once the device is gone.
    } finally {
      signal.removeEventListener('abort', cancel);
      reader.releaseLock();
    }
  }
};
