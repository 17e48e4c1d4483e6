import type { AlloyRevision } from '#shared/contracts/alloy.ts';
import { fromCelsiusDifference, type TemperatureUnit } from '#shared/lib/units.ts';
import { capitalised, elementName, writeWt } from './element-names.ts';
import { quenchWords } from '../../parts/quench-words.ts';

/** One thing compared between two revisions; `change` says the difference in words with its sign, or that there is none. */
export interface ComparedRow {
  readonly what: string;
  readonly before: string;
  readonly now: string;
  readonly change: string;
  readonly isChanged: boolean;
}

/** How temperatures are written: in words with the unit, and the unit itself. */
export interface ComparisonWriting {
  readonly temperature: (celsius: number) => string;
  readonly unit: TemperatureUnit;
}

const signed = (difference: number, decimals: number): string =>
  `${difference < 0 ? '−' : '+'}${Math.abs(difference).toFixed(decimals)}`;

const row = (what: string, before: string, now: string, change: string | null): ComparedRow => ({
  what,
  before,
  now,
  change: change ?? 'the same',
  isChanged: change !== null,
});

const amountChange = (difference: number, element: string): string | null => {
  if (Math.abs(difference) < 5e-4) return null;
  return `${difference < 0 ? '−' : '+'}${writeWt(Math.abs(difference))}: ${difference > 0 ? 'more' : 'less'} ${elementName(element)}`;
};

const compositionRows = (before: AlloyRevision, now: AlloyRevision): readonly ComparedRow[] => {
  const elements = new Set([...Object.keys(now.compositionWt), ...Object.keys(before.compositionWt)]);
  return [...elements].map((element) => {
    const [was, is] = [before.compositionWt[element] ?? 0, now.compositionWt[element] ?? 0];
    return row(
      `${capitalised(elementName(element))}, wt%`,
      writeWt(was),
      writeWt(is),
      amountChange(is - was, element),
    );
  });
};

const temperatures = [
  ['liquidusC', 'Liquidus'],
  ['solidusC', 'Solidus'],
  ['asCastSolidusC', 'As-cast limit'],
  ['solvusC', 'Solvus'],
] as const;

const temperatureRows = (
  { figures: was }: AlloyRevision,
  { figures: is }: AlloyRevision,
  { temperature, unit }: ComparisonWriting,
): readonly ComparedRow[] =>
  temperatures.map(([key, what]) => {
    const [before, now] = [was[key], is[key]];
    const write = (celsius: number | null): string => (celsius === null ? 'none' : temperature(celsius));
    if (before === null || now === null) {
      const change = before === now ? null : now === null ? 'no longer given' : 'given now';
      return row(what, write(before), write(now), change);
    }
    const moved = fromCelsiusDifference(now - before, unit);
    const isMoved = Math.abs(moved) >= 0.05;
    return row(
      what,
      write(before),
      write(now),
      isMoved ? `${signed(moved, 1)} °${unit}: ${moved > 0 ? 'higher' : 'lower'}` : null,
    );
  });

const plainRow = (what: string, before: string, now: string): ComparedRow =>
  row(what, before, now, before === now ? null : 'changed');

const densityRow = (before: AlloyRevision, now: AlloyRevision): ComparedRow => {
  const [was, is] = [before.figures.densityGPerCm3, now.figures.densityGPerCm3];
  const moved = is - was;
  const change =
    Math.abs(moved) < 5e-3 ? null : `${signed(moved, 2)} g/cm³: ${moved > 0 ? 'heavier' : 'lighter'}`;
  return row('Density', `${was.toFixed(2)} g/cm³`, `${is.toFixed(2)} g/cm³`, change);
};

const finenessRow = (before: AlloyRevision, now: AlloyRevision): ComparedRow => {
  const moved = now.fineness - before.fineness;
  const change = moved === 0 ? null : `${signed(moved, 0)}: ${moved > 0 ? 'finer' : 'less fine'}`;
  return row('Fineness', String(before.fineness), String(now.fineness), change);
};

const toleranceWords = ({ toleranceWt }: AlloyRevision): string =>
  Object.entries(toleranceWt)
    .toSorted(([a], [b]) => a.localeCompare(b))
    .map(([element, wt]) => `${element} ±${writeWt(wt)}`)
    .join(', ') || 'none given';

/** Two revisions of an alloy side by side: composition, fineness, temperatures, density, quench and basis. */
export const compareRevisions = (
  before: AlloyRevision,
  now: AlloyRevision,
  writing: ComparisonWriting,
): readonly ComparedRow[] => [
  ...compositionRows(before, now),
  plainRow('Tolerances, wt%', toleranceWords(before), toleranceWords(now)),
  finenessRow(before, now),
  ...temperatureRows(before, now, writing),
  densityRow(before, now),
  plainRow('Quench', quenchWords(before.quench), quenchWords(now.quench)),
  plainRow('Basis', before.figures.basis, now.figures.basis),
  plainRow('Engine', before.figures.engineVersion ?? 'none', now.figures.engineVersion ?? 'none'),
];
