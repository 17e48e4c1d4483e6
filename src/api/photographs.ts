import type { Photograph } from '#shared/contracts/card.ts';
import type { Problem } from '#shared/contracts/problem.ts';
import { ProblemError, UnreachableError } from '#src/lib/http.ts';

/** A picture takes longer than a line of words over a workshop's network. */
const takesAtMostMs = 60_000;

const send = async (path: string, picture: Blob): Promise<Response> => {
  try {
    return await fetch(path, {
      method: 'POST',
      credentials: 'same-origin',
      headers: {
        Accept: 'application/json',
        'Content-Type': 'application/octet-stream',
        'Ladlemark-Place': 'terminal',
      },
      body: picture,
      signal: AbortSignal.timeout(takesAtMostMs),
    });
  } catch {
    throw new UnreachableError();
  }
};

/** Keeps a photograph of a melt under the mark `id`; sending it again is harmless. */
export const addPhotograph = async (meltId: string, id: string, picture: Blob): Promise<Photograph> => {
  const response = await send(`/api/melts/${meltId}/photographs?id=${id}`, picture);
  const answer: unknown = await response.json().catch(() => {
    throw new UnreachableError();
  });
  if (!response.ok) throw new ProblemError(answer as Problem);
  return answer as Photograph;
};
