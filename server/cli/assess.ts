import { mkdirSync, writeFileSync } from 'node:fs';
import { COMMITTED, type ModelParameters } from '#shared/metallurgy/model.ts';
import { fitStage, rootMeanSquare, type Fit } from './assess/fit.ts';
import { POINTS } from './assess/points.ts';
import { assessmentReport } from './assess/report.ts';
import { sanityChecks } from './assess/sanity.ts';
import { STAGES } from './assess/stages.ts';

const PARAMETERS = new URL('../../shared/metallurgy/data/parameters.json', import.meta.url);
const REPORTS = new URL('../../docs/assessment/', import.meta.url);

const fitAll = (start: ModelParameters): readonly Fit[] => {
  const fits: Fit[] = [];
  for (const stage of STAGES) fits.push(fitStage(stage, fits.at(-1)?.model ?? start, POINTS));
  return fits;
};

/** Only the published sets are kept from the committed file, so that a run never starts from its own answer. */
const publishedOnly: ModelParameters = {
  ...COMMITTED,
  interactions: [
    ...COMMITTED.interactions.filter(({ basis }) => basis !== 'assessed'),
    ...STAGES.flatMap((stage) => stage.build(stage.parameters.map(({ start }) => start))),
  ],
};

const fits = fitAll(publishedOnly);
const model = fits.at(-1)?.model ?? publishedOnly;
const checks = sanityChecks(model);

mkdirSync(REPORTS, { recursive: true });
writeFileSync(PARAMETERS, `${JSON.stringify(model, null, 1)}\n`);
writeFileSync(new URL('report.md', REPORTS), assessmentReport(fits, POINTS, checks));
const residuals = Object.fromEntries(fits.map((fit) => [fit.stage.name, fit.residuals]));
writeFileSync(new URL('residuals.json', REPORTS), `${JSON.stringify(residuals, null, 1)}\n`);

for (const fit of fits) {
  const used = rootMeanSquare(fit.residuals, (r) => r.use === 'fit' && r.quantity !== 'solvus');
  const kept = rootMeanSquare(fit.residuals, (r) => r.use === 'held-back');
  console.log(
    `${fit.stage.title}: ${used.rmsC.toFixed(1)} °C rms on ${used.count} values used, ${kept.rmsC.toFixed(1)} °C on ${kept.count} held back`,
  );
}
for (const check of checks)
  console.log(`${check.passed ? 'holds' : 'FAILS'}: ${check.what} (${check.found})`);
if (checks.some((check) => !check.passed)) process.exitCode = 1;
