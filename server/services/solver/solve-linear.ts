import createHighs, { type Highs } from 'highs';

let ready: Promise<Highs> | null = null;

/** A solved programme: the value of each variable, the cost, and how far it may be from the best, as a share of the cost. */
export interface LinearSolution {
  readonly values: Readonly<Record<string, number>>;
  readonly cost: number;
}

/** How long one programme may take, s, and how near to the best it must come. */
const options = { time_limit: 5, mip_rel_gap: 1e-4, output_flag: false } as const;

/** Solves a programme in the CPLEX LP format with HiGHS; null when nothing satisfies it. */
export const solveLinear = async (programme: string): Promise<LinearSolution | null> => {
  ready ??= createHighs();
  const highs = await ready;
  const solution = highs.solve(programme, options);
  const isSolved = solution.Status === 'Optimal' || solution.Status === 'Time limit reached';
  if (!isSolved) return null;
  const values: Record<string, number> = {};
  for (const [name, column] of Object.entries(solution.Columns)) {
    if (!('Primal' in column)) return null;
    values[name] = column.Primal;
  }
  return { values, cost: solution.ObjectiveValue };
};
