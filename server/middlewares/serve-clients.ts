import express, { Router, type RequestHandler } from 'express';
import { join } from 'node:path';

const page =
  (root: string, file: string): RequestHandler =>
  (_request, response) =>
    // `root` keeps it working when a folder above begins with a dot.
    response.sendFile(file, { root, headers: { 'Cache-Control': 'no-cache' } });

/** Serves the built desk at `/` and the built terminal at `/kiosk`; each answers every address below it. */
export const serveClients = (clientsDir: string): Router => {
  const router = Router();
  router.use(
    '/assets',
    express.static(join(clientsDir, 'assets'), { immutable: true, maxAge: '1y', fallthrough: false }),
  );
  router.use(express.static(clientsDir, { index: false, redirect: false }));
  router.get(['/kiosk', '/kiosk/{*path}'], page(clientsDir, 'kiosk/index.html'));
  router.get('/{*path}', page(clientsDir, 'index.html'));
  return router;
};
