import type { Casting } from '#shared/contracts/casting.ts';
import type { CastingState } from '#shared/domain/casting/casting-state.ts';
import { splitCode } from '#shared/lib/codes.ts';

const beforePour: readonly CastingState[] = ['invested', 'dewaxed', 'burning-out', 'holding'];

/** A casting as the sentence of its day needs it. */
export type DayCasting = Pick<Casting, 'id' | 'flask' | 'alloy' | 'state' | 'plannedPourAt'>;

/** Whether the casting still waits for its pour. */
export const isToPour = ({ state }: Pick<Casting, 'state'>): boolean => beforePour.includes(state);

/** Whether the casting's metal is in its mould. */
export const isPoured = ({ state }: Pick<Casting, 'state'>): boolean =>
  !isToPour({ state }) && state !== 'held' && state !== 'scrapped';

/** The casting to be poured next: the earliest that still waits and that no terminal has taken up; null when none does. */
export const nextCasting = <Item extends DayCasting>(
  castings: readonly Item[],
  runningIds: ReadonlySet<string>,
): Item | null =>
  castings
    .filter((casting) => isToPour(casting) && !runningIds.has(casting.id))
    .toSorted((a, b) => Date.parse(a.plannedPourAt) - Date.parse(b.plannedPourAt))[0] ?? null;

/** A span of minutes in words: `8 min`, `2 h 40 min`. */
export const spanWords = (minutes: number): string => {
  const whole = Math.round(minutes);
  if (whole < 60) return `${whole} min`;
  const rest = whole % 60;
  return `${Math.floor(whole / 60)} h${rest === 0 ? '' : ` ${rest} min`}`;
};

const dueWords = (plannedPourAt: string, nowMs: number): string => {
  const minutes = Math.round((Date.parse(plannedPourAt) - nowMs) / 60_000);
  if (minutes === 0) return 'due now';
  return minutes > 0 ? `in ${spanWords(minutes)}` : `due ${spanWords(-minutes)} ago`;
};

/**
 * A day in one sentence: how many castings are planned, poured, running and held, and on the running day (`nowMs` given)
 * what pours next and when.
 */
export const daySentence = (
  castings: readonly DayCasting[],
  runningIds: ReadonlySet<string>,
  nowMs: number | null,
): string => {
  const count = (test: (casting: DayCasting) => boolean): number => castings.filter(test).length;
  const running = count(({ id }) => runningIds.has(id));
  const held = count(({ state }) => state === 'held');
  const scrapped = count(({ state }) => state === 'scrapped');
  const parts = [
    `${castings.length} ${castings.length === 1 ? 'pour' : 'pours'} planned`,
    `${count((casting) => isPoured(casting) && !runningIds.has(casting.id))} poured`,
    running > 0 ? `${running} at the furnace` : '',
    held > 0 ? `${held} on hold` : '',
    scrapped > 0 ? `${scrapped} scrapped` : '',
  ].filter(Boolean);
  const next = nowMs === null ? null : nextCasting(castings, runningIds);
  const after =
    nowMs === null || next === null
      ? ''
      : ` Next: ${splitCode(next.flask.code).main}, ${next.alloy.name}, ${dueWords(next.plannedPourAt, nowMs)}.`;
  return `${parts.join(', ')}.${after}`;
};
