import type { QueryClient } from '@tanstack/react-query';
import { noteServerTime } from '#kiosk/lib/server-clock.ts';

const serverTimeOf = (data: unknown): string | null => {
  const { serverTime } = (data ?? {}) as { serverTime?: unknown };
  return typeof serverTime === 'string' ? serverTime : null;
};

/** Keeps the server's clock from every answer that carries it. */
export const watchServerTime = (client: QueryClient): void => {
  client.getQueryCache().subscribe((event) => {
    if (event.type !== 'updated' || event.action.type !== 'success' || event.action.manual) return;
    const serverTime = serverTimeOf(event.action.data);
    if (serverTime !== null) noteServerTime(serverTime, event.query.state.dataUpdatedAt);
  });
};
