import { rootMeanSquare, type Fit, type Residual } from './fit.ts';
import type { AssessmentPoint, Use } from './points.ts';
import type { SanityCheck } from './sanity.ts';

const table = (head: readonly string[], rows: readonly (readonly string[])[]): string =>
  [head, head.map(() => '---'), ...rows].map((row) => `| ${row.join(' | ')} |`).join('\n');

const number = (value: number, digits = 1): string => value.toFixed(digits);

const meltingOnly = ({ quantity }: Residual): boolean => quantity !== 'solvus';

const summaryRow = (fit: Fit, use: Use, label: string): readonly string[] => {
  const both = rootMeanSquare(fit.residuals, (r) => r.use === use && meltingOnly(r));
  const liquidus = rootMeanSquare(fit.residuals, (r) => r.use === use && r.quantity === 'liquidus');
  const shown = ({ rmsC, count }: typeof both) => (count > 0 ? `${number(rmsC)} (${count})` : '-');
  return [fit.stage.title, label, shown(both), shown(liquidus)];
};

const parameterRows = ({ stage, values, errors }: Fit): readonly (readonly string[])[] =>
  stage.parameters.map((p, k) => [p.meaning, number(values[k] ?? 0, 3), number(errors[k] ?? 0, 3), p.unit]);

const residualRows = ({ residuals }: Fit): readonly (readonly string[])[] =>
  residuals.map((r) => [
    r.name,
    r.quantity,
    number(r.valueC),
    number(r.computedC),
    number(r.residualC),
    r.use,
    number(r.sigmaC),
    r.use === 'fit' ? (1 / r.sigmaC ** 2).toFixed(4) : '0',
  ]);

const sourceRows = (points: readonly AssessmentPoint[]): readonly (readonly string[])[] =>
  points.map((p) => [
    p.name,
    Object.entries(p.wt)
      .map(([e, wt]) => `${e} ${wt}`)
      .join(', '),
    p.basis,
    p.source,
  ]);

const doubts = (fit: Fit, use: Use): string =>
  fit.residuals
    .filter((r) => r.use === use && r.why)
    .map((r) => `- **${r.name}, ${r.quantity} ${r.valueC} °C** (computed ${number(r.computedC)}): ${r.why}`)
    .join('\n');

const stageSection = (fit: Fit, points: readonly AssessmentPoint[]): string =>
  [
    `## ${fit.stage.title}`,
    fit.stage.choices,
    table(['parameter', 'value', 'standard error', 'unit'], parameterRows(fit)),
    table(
      ['alloy', 'value', 'published °C', 'computed °C', 'difference', 'use', 'sigma °C', 'weight'],
      residualRows(fit),
    ),
    ...(doubts(fit, 'doubtful') ? ['Not fitted because it looks wrong:', doubts(fit, 'doubtful')] : []),
    table(['alloy', 'wt%', 'basis', 'source'], sourceRows(points.filter((p) => p.stage === fit.stage.name))),
  ].join('\n\n');

/** The report of an assessment as Markdown. */
export const assessmentReport = (
  fits: readonly Fit[],
  points: readonly AssessmentPoint[],
  checks: readonly SanityCheck[],
): string =>
  [
    '# Assessment of the phase model',
    'Written by `npm run assess`; do not edit. Differences are computed less published, °C. The weight of a value is ' +
      '1 / sigma². Ag-Cu, Ag-Au, Cu-Zn and the pure elements are published sets and are not fitted.',
    '## Summary: root mean square difference, °C (number of values)',
    table(
      ['system', 'points', 'solidus and liquidus', 'liquidus'],
      fits.flatMap((fit) => [
        summaryRow(fit, 'fit', 'used'),
        summaryRow(fit, 'held-back', 'held back'),
        summaryRow(fit, 'doubtful', 'doubtful, not used'),
      ]),
    ),
    'Held back in advance: the middle alloy of each carat series, two of the seven fillers, and alloys whose ' +
      'composition is partly assumed. Sigma is 5 °C for a liquidus and 7 °C for a solidus, doubled where the source ' +
      'calls itself uncertain, 2.5 °C for the Au-Cu minimum.',
    ...fits.map((fit) => stageSection(fit, points)),
    '## Does anything absurd happen elsewhere?',
    table(
      ['check', 'result', 'found'],
      checks.map((c) => [c.what, c.passed ? 'holds' : '**fails**', c.found]),
    ),
    '',
  ].join('\n\n');
