import type { RequestHandler } from 'express';
import helmet from 'helmet';

const headers = (frameAncestors: "'none'" | "'self'"): RequestHandler =>
  helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: ["'self'"],
        styleSrc: ["'self'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        mediaSrc: ["'self'", 'blob:'],
        fontSrc: ["'self'"],
        connectSrc: ["'self'"],
        objectSrc: ["'none'"],
        baseUri: ["'none'"],
        formAction: ["'self'"],
        frameAncestors: [frameAncestors],
      },
    },
    strictTransportSecurity: false,
    crossOriginEmbedderPolicy: false,
  });

/** The one page that is shown in a frame: the terminal's preview, in the desk's editor of the work instruction. */
const framed = '/kiosk/preview';

/** Security headers; no script or style from anywhere but our own files. Served over plain HTTP in a studio, so no HSTS. */
export const secureHeaders = (): RequestHandler => {
  const [plain, inOurFrame] = [headers("'none'"), headers("'self'")];
  return (request, response, next) => (request.path === framed ? inOurFrame : plain)(request, response, next);
};
