import type { Request } from 'express';
import { AppError, fieldError } from '../errors.ts';
import type { Http } from './http.ts';

/** The most a document may hold. */
export const uploadLimitBytes = 10 * 1024 * 1024;

const tooLarge = ({ response }: Http): AppError => {
  // What is still on its way is not waited for.
  response.set('Connection', 'close');
  return new AppError('too-large', 'The file is larger than 10 MB. Scan it at a lower resolution.');
};

const collect = async (request: Request, http: Http): Promise<Buffer> => {
  const chunks: Buffer[] = [];
  let bytes = 0;
  for await (const chunk of request as AsyncIterable<Buffer>) {
    bytes += chunk.length;
    if (bytes > uploadLimitBytes) throw tooLarge(http);
    chunks.push(chunk);
  }
  return Buffer.concat(chunks);
};

/** Reads a file that is sent as the body of a request, of at most 10 MB; refused before it is read where its length says so. */
export const readUpload = async (http: Http): Promise<Buffer> => {
  const { request } = http;
  if (Number(request.get('content-length') ?? 0) > uploadLimitBytes) throw tooLarge(http);
  const content = request.readableEnded ? Buffer.alloc(0) : await collect(request, http);
  if (content.length === 0) throw fieldError('file', 'The file is empty, or was not sent as a file.');
  return content;
};
