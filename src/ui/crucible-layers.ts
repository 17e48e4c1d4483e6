import { spreadLabels } from './spread-labels.ts';

/** One lot of a charge. */
export interface CrucibleLot {
  readonly key: string;
  /** A few words, such as "fine gold G-31". */
  readonly label: string;
  readonly kind: 'gold' | 'silver' | 'returns' | 'other';
  /** Grams already in the crucible. */
  readonly inG: number;
  /** Grams planned. */
  readonly plannedG: number;
}

/** One layer in the picture of a crucible, of metal that is in or that is still to come. */
export interface CrucibleLayer {
  readonly key: string;
  readonly lotKey: string;
  readonly kind: CrucibleLot['kind'];
  readonly isIn: boolean;
  readonly y: number;
  readonly height: number;
}

/** The words beside a lot's first layer, with the lot's masses in grams. */
export interface CrucibleLabel {
  readonly key: string;
  readonly text: string;
  readonly inG: number;
  readonly plannedG: number;
  readonly y: number;
}

/** What the picture of a crucible is drawn from: layers from the bottom up, labels from the top down. */
export interface CrucibleLayers {
  readonly layers: readonly CrucibleLayer[];
  readonly labels: readonly CrucibleLabel[];
  readonly wantedY: number;
}

const labelGap = 60;
const traceG = 1e-6;

const partsOf = (lots: readonly CrucibleLot[]) =>
  [
    ...lots.map((lot) => ({ lot, isIn: true, grams: lot.inG })),
    ...lots.map((lot) => ({ lot, isIn: false, grams: lot.plannedG - lot.inG })),
  ].filter((part) => part.grams > traceG);

const labelsOf = (
  lots: readonly CrucibleLot[],
  layers: readonly CrucibleLayer[],
  highest: number,
  lowest: number,
): readonly CrucibleLabel[] => {
  const named = lots.flatMap((lot) => {
    const layer = layers.find((candidate) => candidate.lotKey === lot.key);
    return layer ? [{ lot, middle: Math.max(highest, layer.y + layer.height / 2) }] : [];
  });
  const topDown = named.toSorted((a, b) => a.middle - b.middle);
  const heights = spreadLabels(
    topDown.map(({ middle }) => middle),
    labelGap,
    lowest,
  );
  return topDown.map(({ lot, middle }, index) => ({
    key: lot.key,
    text: lot.label,
    inG: lot.inG,
    plannedG: lot.plannedG,
    y: heights[index] ?? middle,
  }));
};

/** Stacks what is in, then what is still to come; a charge over the wanted mass rises above the wanted line. */
export const crucibleLayers = (
  lots: readonly CrucibleLot[],
  wantedG: number,
  top: number,
  bottom: number,
): CrucibleLayers => {
  const parts = partsOf(lots);
  const stacked = parts.reduce((sum, part) => sum + part.grams, 0);
  const perGram = (bottom - top) / (Math.max(wantedG, stacked, traceG) * 1.1);
  let level = bottom;
  const layers = parts.map(({ lot, isIn, grams }) => {
    const height = grams * perGram;
    level -= height;
    return {
      key: `${lot.key}-${isIn ? 'in' : 'come'}`,
      lotKey: lot.key,
      kind: lot.kind,
      isIn,
      y: level,
      height,
    };
  });
  const wantedY = bottom - wantedG * perGram;
  return { layers, labels: labelsOf(lots, layers, wantedY + 46, bottom - 24), wantedY };
};
