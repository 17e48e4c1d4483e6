/** What is to be hung on a day's picture. */
export interface Hangable {
  readonly id: string;
  readonly bay: string;
  readonly plannedPourAt: string;
}

/** One drop: where it hangs along its bay's line, and how many steps below it so that no two overlap. */
export interface Drop<Item extends Hangable> {
  readonly item: Item;
  readonly x: number;
  readonly level: number;
}

/** A furnace bay with its drops, earliest first. */
export interface BayOfDrops<Item extends Hangable> {
  readonly bay: string;
  readonly drops: readonly Drop<Item>[];
  /** How many levels its drops need, at least 1. */
  readonly levels: number;
}

const hang = <Item extends Hangable>(
  items: readonly Item[],
  x: (ms: number) => number,
  width: number,
): readonly Drop<Item>[] => {
  const lastAt: number[] = [];
  return [...items]
    .sort((a, b) => Date.parse(a.plannedPourAt) - Date.parse(b.plannedPourAt))
    .map((item) => {
      const at = x(Date.parse(item.plannedPourAt));
      const free = lastAt.findIndex((last) => at - last >= width);
      const level = free === -1 ? lastAt.length : free;
      lastAt[level] = at;
      return { item, x: at, level };
    });
};

/**
 * Hangs each casting's drop under its bay at its planned time; drops nearer than `width` hang at different levels, the
 * highest free one first. `x` maps ms since the epoch to the picture. Bays come in the order of their names.
 */
export const placeDrops = <Item extends Hangable>(
  items: readonly Item[],
  x: (ms: number) => number,
  width: number,
): readonly BayOfDrops<Item>[] => {
  const bays = [...new Set(items.map(({ bay }) => bay))].sort((a, b) =>
    a.localeCompare(b, 'en', { numeric: true }),
  );
  return bays.map((bay) => {
    const drops = hang(
      items.filter((item) => item.bay === bay),
      x,
      width,
    );
    return { bay, drops, levels: Math.max(1, ...drops.map(({ level }) => level + 1)) };
  });
};
