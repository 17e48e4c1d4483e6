import type { IncomingMessage, RequestListener, Server, ServerResponse } from 'node:http';

/** Vite inside our own server: pages with hot reload from it, everything under /api from the product. */
export interface DevClients {
  readonly handler: RequestListener;
  readonly close: () => Promise<void>;
}

const isApi = (url: string | undefined): boolean => /^\/api(?:[/?]|$)/.test(url ?? '');

/** Starts Vite in middleware mode on the same port as the server. */
export const createDevClients = async (server: Server, api: RequestListener): Promise<DevClients> => {
  const vite = await import('vite');
  const dev = await vite.createServer({
    appType: 'spa',
    // Loaded as it is: the bundled copy Vite writes and removes would look like a changed server file to tsx.
    configLoader: 'native',
    logLevel: 'warn',
    server: { middlewareMode: true, hmr: { server } },
  });
  const handler = (request: IncomingMessage, response: ServerResponse): void => {
    if (isApi(request.url)) api(request, response);
    else dev.middlewares(request, response);
  };
  return { handler, close: () => dev.close() };
};
