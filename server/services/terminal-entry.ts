import type { Connect, Plugin } from 'vite';

const isPageUnderKiosk = (url: string, accept: string | undefined): boolean =>
  /^\/kiosk(?:[/?#]|$)/.test(url) && !/\.\w+(?:[?#]|$)/.test(url) && (accept ?? '').includes('text/html');

const rewrite: Connect.NextHandleFunction = (request, _response, next) => {
  if (isPageUnderKiosk(request.url ?? '', request.headers.accept)) request.url = '/kiosk/index.html';
  next();
};

/** Vite plugin that answers every page under `/kiosk` with the terminal's own entry, in dev and preview. */
export const terminalEntry = (): Plugin => ({
  name: 'terminal-entry',
  configureServer: (server) => void server.middlewares.use(rewrite),
  configurePreviewServer: (server) => void server.middlewares.use(rewrite),
});
