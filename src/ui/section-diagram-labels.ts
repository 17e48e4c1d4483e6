import type { DiagramFrame, DiagramPoint, DiagramScales } from './section-diagram-frame.ts';

/** A label and its place: the middle of its words in px, their size, and whether they stand on end. */
export interface LabelPlace {
  readonly words: string;
  readonly x: number;
  readonly y: number;
  readonly size: number;
  readonly upright: boolean;
  /** The place in its field that words standing outside point to. */
  readonly leader?: { readonly x: number; readonly y: number };
}

/** A field to be labelled. */
export interface LabelledField {
  readonly words: string;
  /** What is written where the words have no room. */
  readonly shortWords?: string;
  readonly outline: readonly DiagramPoint[];
}

/** An upright strip that no label may cover, px. */
export interface KeptClear {
  readonly left: number;
  readonly right: number;
}

const cell = 7;
// Mean width of a letter of the heavy face, as a share of its size; measured a little wide.
const letterShare = 0.51;

type Ring = readonly (readonly [number, number])[];

const isInside = (ring: Ring, px: number, py: number): boolean => {
  let inside = false;
  for (let k = 0, before = ring.length - 1; k < ring.length; before = k, k += 1) {
    const [ax, ay] = ring[k] ?? [0, 0];
    const [bx, by] = ring[before] ?? [0, 0];
    if (ay > py !== by > py && px < ((bx - ax) * (py - ay)) / (by - ay) + ax) inside = !inside;
  }
  return inside;
};

/** Which field owns each cell of the frame; the last drawn wins, -1 for none and for what is kept clear. */
const ownersOf = (
  rings: readonly Ring[],
  { left, right, top, bottom }: DiagramFrame,
  clear: readonly KeptClear[],
) => {
  const columns = Math.floor((right - left) / cell);
  const rows = Math.floor((bottom - top) / cell);
  const owner = new Int8Array(columns * rows).fill(-1);
  for (let row = 0; row < rows; row += 1) {
    for (let column = 0; column < columns; column += 1) {
      const [px, py] = [left + (column + 0.5) * cell, top + (row + 0.5) * cell];
      if (clear.some((strip) => px > strip.left && px < strip.right)) continue;
      owner[row * columns + column] = rings.findLastIndex((ring) => isInside(ring, px, py));
    }
  }
  return { owner, columns, rows };
};

type Owners = ReturnType<typeof ownersOf>;

/** Sums over all cells above and to the left, so that any box is counted in four look-ups. */
const sumsOf = ({ owner, columns, rows }: Owners, field: number): Int32Array => {
  const wide = columns + 1;
  const sums = new Int32Array(wide * (rows + 1));
  for (let row = 0; row < rows; row += 1) {
    for (let column = 0; column < columns; column += 1) {
      const own = owner[row * columns + column] === field ? 1 : 0;
      const at = (row + 1) * wide + column + 1;
      sums[at] = own + (sums[at - 1] ?? 0) + (sums[at - wide] ?? 0) - (sums[at - wide - 1] ?? 0);
    }
  }
  return sums;
};

/** Every box of the given size, in cells, that lies wholly in the field: its top left cells. */
const roomsFor = (owners: Owners, sums: Int32Array, width: number, height: number) => {
  const wide = owners.columns + 1;
  const rooms: (readonly [number, number])[] = [];
  for (let row = 0; row + height <= owners.rows; row += 1) {
    for (let column = 0; column + width <= owners.columns; column += 1) {
      const sum = (r: number, c: number): number => sums[r * wide + c] ?? 0;
      const held =
        sum(row + height, column + width) -
        sum(row, column + width) -
        sum(row + height, column) +
        sum(row, column);
      if (held === width * height) rooms.push([column, row]);
    }
  }
  return rooms;
};

const middleOf = (rooms: readonly (readonly [number, number])[]): readonly [number, number] | undefined => {
  if (rooms.length === 0) return undefined;
  const mean = [0, 1].map((axis) => rooms.reduce((sum, room) => sum + (room[axis] ?? 0), 0) / rooms.length);
  const [meanColumn = 0, meanRow = 0] = mean;
  const distance = ([column, row]: readonly [number, number]) =>
    Math.hypot(column - meanColumn, row - meanRow);
  return rooms.reduce((best, room) => (distance(room) < distance(best) ? room : best));
};

const placeLabel = (
  words: string,
  owners: Owners,
  sums: Int32Array,
  { left, top }: DiagramFrame,
  sizes: readonly number[],
): LabelPlace | null => {
  const tries = [
    ...sizes.map((size) => [size, false] as const),
    ...sizes.slice(1).map((s) => [s, true] as const),
  ];
  for (const [size, upright] of tries) {
    for (const margin of [10, 3]) {
      const long = Math.ceil((words.length * size * letterShare + 2 * margin) / cell);
      const high = Math.ceil((size * 1.1 + 2 * margin) / cell);
      const [width, height] = upright ? [high, long] : [long, high];
      const room = middleOf(roomsFor(owners, sums, width, height));
      if (!room) continue;
      const [column, row] = room;
      return {
        words,
        x: left + (column + width / 2) * cell,
        y: top + (row + height / 2) * cell,
        size,
        upright,
      };
    }
  }
  return null;
};

/** The cell of a field that has most of the field straight above and below it. */
const thickestCell = ({ owner, columns, rows }: Owners, field: number): readonly [number, number] | null => {
  let best: { readonly at: readonly [number, number]; readonly height: number } | null = null;
  for (let column = 0; column < columns; column += 1) {
    const held = Array.from({ length: rows }, (_, row) => row).filter(
      (row) => owner[row * columns + column] === field,
    );
    if (held.length > (best?.height ?? 0)) {
      best = { at: [column, held[held.length >> 1] ?? 0], height: held.length };
    }
  }
  return best?.at ?? null;
};

/** A place for a field's words in the roomy field over it, with a line to the field itself. */
const callOut = (
  words: string,
  field: number,
  owners: Owners,
  { left, top }: DiagramFrame,
  size: number,
): LabelPlace | null => {
  const cellOf = thickestCell(owners, field);
  if (!cellOf) return null;
  const [width, height] = [
    Math.ceil((words.length * size * letterShare + 12) / cell),
    Math.ceil((size + 12) / cell),
  ];
  const wanted = [cellOf[0] - width / 2 + 10, cellOf[1] - 11 - height] as const;
  const rooms = roomsFor(owners, sumsOf(owners, 0), width, height);
  const distance = ([column, row]: readonly [number, number]) =>
    Math.hypot(column - wanted[0], row - wanted[1]);
  const [first, ...rest] = rooms;
  if (!first) return null;
  const [column, row] = rest.reduce((best, room) => (distance(room) < distance(best) ? room : best), first);
  return {
    words,
    x: left + (column + width / 2) * cell,
    y: top + (row + height / 2) * cell,
    size,
    upright: false,
    leader: { x: left + (cellOf[0] + 0.5) * cell, y: top + (cellOf[1] + 0.5) * cell },
  };
};

/** Takes the cells under a label away from their field, so that no other label is put there. */
const takeCells = ({ owner, columns }: Owners, place: LabelPlace, { left, top }: DiagramFrame): void => {
  const half = (place.words.length * place.size * letterShare) / 2 + 8;
  const [reachX, reachY] = place.upright ? [place.size, half] : [half, place.size];
  for (let index = 0; index < owner.length; index += 1) {
    const px = left + ((index % columns) + 0.5) * cell;
    const py = top + (Math.floor(index / columns) + 0.5) * cell;
    if (Math.abs(px - place.x) < reachX && Math.abs(py - place.y) < reachY) owner[index] = -1;
  }
};

/**
 * Finds each field a place where its words fit, as near its middle as may be; the first field, the liquid, also takes
 * the words of fields too thin for them. Null where they fit nowhere.
 */
export const labelPlaces = (
  fields: readonly LabelledField[],
  scales: DiagramScales,
  frame: DiagramFrame,
  clear: readonly KeptClear[],
  sizes: readonly number[],
): readonly (LabelPlace | null)[] => {
  const rings = fields.map(({ outline }) =>
    outline.map((p) => [scales.x(p.x), scales.y(p.temperatureC)] as const),
  );
  const owners = ownersOf(rings, frame, clear);
  const inside = fields.map(({ words, shortWords }, field) => {
    const sums = sumsOf(owners, field);
    const place = (text: string | undefined) => (text ? placeLabel(text, owners, sums, frame, sizes) : null);
    return place(words) ?? place(shortWords);
  });
  for (const place of inside) if (place) takeCells(owners, place, frame);
  return inside.map((place, field) => {
    const words = fields[field]?.words;
    if (place || words === undefined) return place;
    const outside = callOut(words, field, owners, frame, sizes[1] ?? sizes[0] ?? 14);
    if (outside) takeCells(owners, outside, frame);
    return outside;
  });
};
