import { useInfiniteQuery, useQuery } from '@tanstack/react-query';
import type { Casting } from '#shared/contracts/casting.ts';
import type { MeltSummary } from '#shared/contracts/melt.ts';
import { castingsQuery } from '#src/api/castings.ts';
import { meltsQuery } from '#src/api/melts.ts';

const isRunning = ({ step }: MeltSummary): boolean => step !== 'done' && step !== 'abandoned';

/** A day's castings beside the melts that belong to them. */
export interface Day {
  readonly castings: readonly Casting[];
  /** Melts by the id of their casting. */
  readonly melts: ReadonlyMap<string, MeltSummary>;
  /** Castings whose card is open at a terminal. */
  readonly runningIds: ReadonlySet<string>;
  /** Melts on which work is stopped now, of whatever day. */
  readonly stopped: readonly MeltSummary[];
}

const dayOf = (castings: readonly Casting[], melts: readonly MeltSummary[]): Day => {
  const byId = new Map(melts.map((melt) => [melt.id, melt]));
  const pairs = castings.flatMap(({ id, melt }) => {
    const summary = melt && byId.get(melt.id);
    return summary ? [[id, summary] as const] : [];
  });
  return {
    castings,
    melts: new Map(pairs),
    runningIds: new Set(pairs.filter(([, melt]) => isRunning(melt)).map(([id]) => id)),
    stopped: melts.filter(({ stop }) => stop !== null),
  };
};

/** Reads the castings planned for a local day and the newest melts, again every few seconds. */
export const useDay = (day: string) => {
  const castings = useQuery(castingsQuery(day));
  const melts = useInfiniteQuery({ ...meltsQuery, refetchInterval: 5_000 });
  const { data, error, refetch, isFetching } = castings;
  const listed = melts.data?.pages.flatMap((page) => page.melts) ?? [];
  return { data: data && dayOf(data, listed), error, refetch, isFetching };
};
