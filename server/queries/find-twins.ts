import type { IntakeLot } from '#shared/domain/metal/judge-intake-row.ts';
import { toMilligrams } from '#shared/domain/metal/ledger.ts';
import type { Services } from '../services/services.ts';

/** Asks about a row that looks as if its lot were in already, or stood twice in the sheet; null where it does not. */
export type Twins = (lot: IntakeLot, line: number) => string | null;

/** What makes two lots look like one: name, kind, mass and the supplier's reference. */
const likenessOf = (lot: {
  readonly name: string;
  readonly kind: string;
  readonly massMg: number;
  readonly supplierReference: string;
}): string => JSON.stringify([lot.name, lot.kind, lot.massMg, lot.supplierReference]);

const likenessOfRow = ({ massG, ...lot }: IntakeLot): string =>
  likenessOf({ ...lot, massMg: toMilligrams(massG) });

/** Looks for the lots of a sheet among those already taken in, and for rows that repeat another. */
export const findTwins = async (
  { models }: Services,
  rows: readonly { readonly line: number; readonly lot: IntakeLot | null }[],
): Promise<Twins> => {
  const told = rows.flatMap(({ line, lot }) => (lot === null ? [] : [{ line, lot }]));
  const known = await models.Lot.findAll({
    where: { name: [...new Set(told.map(({ lot }) => lot.name))], meltId: null },
    attributes: ['code', 'name', 'kind', 'receivedMg', 'supplierReference'],
  });
  const codes = new Map(
    known.map(({ code, name, kind, receivedMg, supplierReference }) => [
      likenessOf({ name, kind, massMg: receivedMg, supplierReference }),
      code,
    ]),
  );
  const firstLines = new Map<string, number>();
  for (const { line, lot } of told) {
    const likeness = likenessOfRow(lot);
    if (!firstLines.has(likeness)) firstLines.set(likeness, line);
  }
  return (lot, line) => {
    const likeness = likenessOfRow(lot);
    const code = codes.get(likeness);
    if (code !== undefined)
      return `It looks like ${code}, which is in already: same name, mass and reference. Is it another?`;
    const first = firstLines.get(likeness);
    return first === undefined || first === line ? null : `It repeats line ${first}. Is it another?`;
  };
};
