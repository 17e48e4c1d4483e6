import { costOffG, type ChargeModel, type ModelRow } from './charge-model.ts';
import { leastWeighingMg } from './charge-request.ts';

/**
 * `whole`: lots are used or not. `relaxed`: using a lot costs in proportion to what is taken of it, which bounds the cost
 * from below. `elastic`: every limit may give way at a price, so that what gives way shows what stands in the way.
 */
export type ModelForm = 'whole' | 'relaxed' | 'elastic';

const term = (coefficient: number, variable: string): string =>
  coefficient === 0 ? '' : ` ${coefficient < 0 ? '-' : '+'} ${Math.abs(coefficient).toFixed(9)} ${variable}`;

const slackOf = ({ name, sense }: ModelRow): string => `${sense === '<=' ? '-' : '+'} slack_${name}`;

const rowLine = (row: ModelRow, form: ModelForm): string =>
  ` ${row.name}:${row.coefficients.map((coefficient, lot) => term(coefficient, `g${lot}`)).join('')}${form === 'elastic' ? ` ${slackOf(row)}` : ''} ${row.sense} ${row.bound.toFixed(9)}`;

const costOf = ({ rows, lots, costPerG, costPerLot, mostG }: ChargeModel, form: ModelForm): string => {
  const off = `${term(costOffG, 'over')}${term(costOffG, 'under')}`;
  switch (form) {
    case 'elastic':
      return rows.map(({ name }) => ` + slack_${name}`).join('');
    case 'relaxed':
      return (
        off +
        lots.map((_, lot) => term(relaxedCost({ costPerG, costPerLot, mostG }, lot), `g${lot}`)).join('')
      );
    case 'whole':
      return (
        off +
        lots
          .map((_, lot) => term(costPerG[lot] ?? 0, `g${lot}`) + term(costPerLot[lot] ?? 0, `u${lot}`))
          .join('')
      );
  }
};

const relaxedCost = (
  { costPerG, costPerLot, mostG }: Pick<ChargeModel, 'costPerG' | 'costPerLot' | 'mostG'>,
  lot: number,
): number => {
  const most = mostG[lot] ?? 0;
  return (costPerG[lot] ?? 0) + (most > 0 ? (costPerLot[lot] ?? 0) / most : 0);
};

/** Writes the programme in the CPLEX LP format. */
export const writeChargeModel = (model: ChargeModel, form: ModelForm): string => {
  const { lots, wantedG, overG, underG, mostG, rows } = model;
  const every = lots.map((_, lot) => lot);
  const least = leastWeighingMg / 1000;
  const isWhole = form === 'whole';
  return [
    'Minimize',
    ` cost:${costOf(model, form)}`,
    'Subject To',
    ` total:${every.map((lot) => ` + g${lot}`).join('')} - over + under = ${wantedG.toFixed(3)}`,
    ...rows
      .filter(
        ({ coefficients }) => form === 'elastic' || coefficients.some((coefficient) => coefficient !== 0),
      )
      .map((row) => rowLine(row, form)),
    ...(isWhole
      ? every.flatMap((lot) => [
          ` most${lot}: g${lot} - ${(mostG[lot] ?? 0).toFixed(3)} u${lot} <= 0`,
          ` least${lot}: g${lot} - ${least.toFixed(3)} u${lot} >= 0`,
        ])
      : []),
    'Bounds',
    ...every.map((lot) => ` 0 <= g${lot} <= ${(mostG[lot] ?? 0).toFixed(3)}`),
    ` 0 <= over <= ${overG.toFixed(3)}`,
    ` 0 <= under <= ${underG.toFixed(3)}`,
    ...(isWhole ? ['Binary', ` ${every.map((lot) => `u${lot}`).join(' ')}`] : []),
    'End',
    '',
  ].join('\n');
};
