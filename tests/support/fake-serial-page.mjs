// Runs in a page before its own scripts: a Web Serial API with a single port, whose bytes a test sends.
{
  const { navigator, ReadableStream, TextEncoder, DOMException } = globalThis;
  let control = null;
  let readable = null;
  let isPlugged = true;
  const listeners = [];
  const port = {
    get readable() {
      return readable;
    },
    open() {
      if (!isPlugged || readable)
        return Promise.reject(new DOMException('Not to be opened.', 'NetworkError'));
      readable = new ReadableStream({
        start(controller) {
          control = controller;
        },
      });
      return Promise.resolve();
    },
    close() {
      readable = null;
      return Promise.resolve();
    },
    getInfo: () => ({ usbVendorId: 1027, usbProductId: 24577 }),
  };
  const serial = {
    getPorts: () => Promise.resolve(isPlugged ? [port] : []),
    requestPort: () => Promise.resolve(port),
    addEventListener: (_type, listener) => listeners.push(listener),
  };
  Object.defineProperty(navigator, 'serial', { configurable: true, value: serial });
  globalThis.fakeInstrument = {
    send(text) {
      control?.enqueue(new TextEncoder().encode(text));
    },
    unplug() {
      isPlugged = false;
      readable = null;
      control?.error(new DOMException('The device has been lost.', 'NetworkError'));
    },
    plugIn() {
      isPlugged = true;
      for (const listener of listeners) listener();
    },
  };
}
