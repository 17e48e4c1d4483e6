import { createServer, type Server } from 'node:http';
import { connect, type AddressInfo, type Socket } from 'node:net';
import { afterEach, describe, expect, it } from 'vitest';
import { closeServer, listen, tryPort } from './listen.ts';

const servers: Server[] = [];
afterEach(() => servers.splice(0).forEach((server) => server.close().closeAllConnections()));

const makeServer = (): Server => {
  const server = createServer((request, response) => {
    request.resume().once('end', () => response.end('poured'));
  });
  servers.push(server);
  return server;
};

const portOf = (server: Server): number => (server.address() as AddressInfo).port;

/** A request whose last two bytes are still to come. */
const beginRequest = (port: number): Promise<Socket> =>
  new Promise((resolve) => {
    const socket = connect(port, '127.0.0.1', () => {
      socket.write('POST / HTTP/1.1\r\nHost: x\r\nContent-Length: 4\r\n\r\nab', () => resolve(socket));
    });
  });

const readAll = (socket: Socket): Promise<string> =>
  new Promise((resolve) => {
    let text = '';
    socket.on('data', (chunk: Buffer) => (text += chunk.toString()));
    socket.once('close', () => resolve(text));
  });

describe('listen', () => {
  it('takes a free port and gives its number', async () => {
    const server = makeServer();
    expect(await listen(server, 0, '127.0.0.1')).toBe(portOf(server));
  });

  it('says which port is taken and what to type instead', async () => {
    const port = await listen(makeServer(), 0, '127.0.0.1');
    await expect(tryPort(port, '127.0.0.1')).rejects.toThrow(`PORT=${port + 1} npm start`);
  });

  it('names HOST when it is not an address of this machine (192.0.2.1 is set aside for documents, RFC 5737)', async () => {
    await expect(tryPort(0, '192.0.2.1')).rejects.toThrow(/^HOST is 192\.0\.2\.1, which is not an address/);
  });
});

describe('closeServer', () => {
  it('takes no new connection and lets a request that has begun finish', async () => {
    const server = makeServer();
    const arrived = new Promise((resolve) => server.once('request', resolve));
    const port = await listen(server, 0, '127.0.0.1');
    const socket = await beginRequest(port);
    await arrived;
    const closed = closeServer(server, 60_000);
    await expect(fetch(`http://127.0.0.1:${port}/`)).rejects.toThrow();
    const answer = readAll(socket);
    socket.write('cd');
    expect(await answer).toContain('poured');
    await closed;
  });

  it('cuts a request that never ends', async () => {
    const server = makeServer();
    const arrived = new Promise((resolve) => server.once('request', resolve));
    const socket = await beginRequest(await listen(server, 0, '127.0.0.1'));
    await arrived;
    const answer = readAll(socket);
    await closeServer(server, 50);
    expect(await answer).toBe('');
  });
});
