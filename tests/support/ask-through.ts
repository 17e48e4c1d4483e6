import type { APIResponse, Page } from 'playwright-core';
import type { Place } from '#server/middlewares/place.ts';

/** Asks the API with the cookies of a page: as whoever is signed in there. */
export const askThrough = (page: Page, origin: string, place: Place) => {
  const headers = { 'Ladlemark-Place': place };
  return {
    get: (path: string): Promise<APIResponse> => page.request.get(`${origin}${path}`, { headers }),
    post: (path: string, data: object): Promise<APIResponse> =>
      page.request.post(`${origin}${path}`, { headers, data }),
  };
};
