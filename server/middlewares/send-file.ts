import type { Readable } from 'node:stream';
import { pipeline } from 'node:stream/promises';
import type { Http } from './http.ts';

/** Sends what someone once uploaded as a download: no browser shall run it, guess at it, or open it as a page of ours. */
export const sendFile = async (
  { response }: Http,
  content: Readable,
  { name, mediaType, bytes }: { readonly name: string; readonly mediaType: string; readonly bytes: number },
): Promise<void> => {
  response.status(200).set({
    'Content-Type': mediaType,
    'Content-Length': String(bytes),
    'Content-Disposition': `attachment; filename*=UTF-8''${encodeURIComponent(name).replace(/['()*]/g, (mark) => `%${mark.charCodeAt(0).toString(16)}`)}`,
    'Content-Security-Policy': "default-src 'none'; sandbox",
    'X-Content-Type-Options': 'nosniff',
    'Cache-Control': 'private, max-age=3600',
  });
  await pipeline(content, response);
};
