import type { Http } from './http.ts';

/** Answers with a file that was written for this request, to be stored and not kept by a cache. */
export const sendDownload = (
  { response }: Http,
  type: string,
  name: string,
  content: string | Buffer,
): void => {
  response
    .set({ 'Content-Disposition': `attachment; filename="${name}"`, 'Cache-Control': 'private, no-store' })
    .type(type)
    .send(content);
};
