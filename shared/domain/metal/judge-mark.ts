import { marksOf, type FinenessMark, type MarkPlace } from './fineness-marks.ts';
import { formatFineness } from './lot.ts';
import { metalName } from './metal-name.ts';

/** A fineness held against the marks of a place. */
export interface MarkVerdict {
  /** The highest mark it reaches without any tolerance; null where it reaches none. */
  readonly reached: FinenessMark | null;
  /** A higher mark that it would reach only by the place's negative tolerance. */
  readonly byTolerance: FinenessMark | null;
  /** Whether the mark that was asked for is one of the place's. */
  readonly isListed: boolean;
  /** All this in words, with the deference that is due. */
  readonly sentence: string;
}

/** What is held against the marks; finenesses in parts per thousand. */
export interface Marked {
  readonly metal: 'Ag' | 'Au';
  /** At the certificates' lower bounds. */
  readonly worstPpt: number;
  /** The mark wanted; left out where only what is reached is asked. */
  readonly markPpt?: number;
}

const placeWords: Readonly<Record<MarkPlace, string>> = {
  'ISO 9202': 'ISO 9202',
  'United Kingdom': 'the United Kingdom',
  'United States': 'the United States',
};

const office = 'The local assay office decides.';

const reachedWords = (
  marks: readonly FinenessMark[],
  reached: FinenessMark | null,
  { metal, worstPpt }: Marked,
  place: string,
): string =>
  reached
    ? `At the worst, ${formatFineness(worstPpt)}, it reaches ${reached.ppt}, a ${metalName(metal)} mark of ${place}.`
    : `At the worst, ${formatFineness(worstPpt)}, it reaches no ${metalName(metal)} mark of ${place}; the lowest is ${marks[0]?.ppt ?? 'not held here'}.`;

/** Judges a fineness by the marks of a place: never rounded up, and never by a tolerance. */
export const judgeMark = (marked: Marked, place: MarkPlace): MarkVerdict => {
  const { metal, worstPpt, markPpt } = marked;
  const marks = marksOf(place, metal);
  const reached = marks.filter(({ ppt }) => worstPpt >= ppt - 1e-9).at(-1) ?? null;
  const byTolerance =
    marks.find(
      ({ ppt, negativeTolerancePpt }) =>
        ppt > (reached?.ppt ?? 0) && worstPpt >= ppt - negativeTolerancePpt - 1e-9,
    ) ?? null;
  const isListed = markPpt === undefined || marks.some(({ ppt }) => ppt === markPpt);
  const words = [
    ...(isListed ? [] : [`${markPpt} is no ${metalName(metal)} mark of ${placeWords[place]}.`]),
    reachedWords(marks, reached, marked, placeWords[place]),
    ...(byTolerance
      ? [
          `Only by a tolerance of ${byTolerance.negativeTolerancePpt} would it pass for ${byTolerance.ppt}; no charge is planned on that.`,
        ]
      : []),
    office,
  ];
  return { reached, byTolerance, isListed, sentence: words.join(' ') };
};
