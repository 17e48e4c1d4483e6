import { networkInterfaces } from 'node:os';

const EVERYWHERE = new Set(['0.0.0.0', '::']);

const networkHosts = (): string[] =>
  Object.values(networkInterfaces())
    .flatMap((addresses) => addresses ?? [])
    .filter((address) => address.family === 'IPv4' && !address.internal)
    .map((address) => address.address);

const asOrigin = (host: string, port: number): string =>
  `http://${host.includes(':') ? `[${host}]` : host}:${port}`;

/** Tells whether only this machine can reach a server that listens on this host. */
export const isLoopback = (host: string): boolean => /^(127\.|::1$|localhost$)/.test(host);

/** The origins under which a browser reaches the server; this machine's own comes first, as cameras need it. */
export const originsOf = (host: string, port: number): readonly string[] => {
  if (isLoopback(host)) return [asOrigin(host === '::1' ? host : 'localhost', port)];
  if (EVERYWHERE.has(host)) return ['localhost', ...networkHosts()].map((name) => asOrigin(name, port));
  return [asOrigin(host, port)];
};
