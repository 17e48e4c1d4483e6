import type { SectionAxis } from './binary-section.ts';
import type { Engine } from './engine.ts';
import { equilibrium } from './equilibrium.ts';
import type { PhaseName, SectionBoundary, SectionField, SectionPoint } from './types.ts';

const COLUMNS = 32;
const ROWS = 40;
const BOTTOM_C = 400;
const HEADROOM_C = 40;

interface Cell extends SectionPoint {
  readonly column: number;
  readonly row: number;
}

const nameOf = (phases: readonly PhaseName[]): string => [...phases].sort().join(' + ');

/** The cell of a field that lies furthest from any other field, in cells. */
const middleOf = (cells: readonly Cell[], others: readonly Cell[]): Cell | undefined => {
  let best: { cell: Cell; distance: number } | undefined;
  for (const cell of cells) {
    let distance = Math.min(cell.column + 1, COLUMNS - cell.column, cell.row + 1, ROWS - cell.row);
    for (const other of others) {
      distance = Math.min(distance, Math.hypot(cell.column - other.column, cell.row - other.row));
    }
    if (!best || distance > best.distance) best = { cell, distance };
  }
  return best?.cell;
};

/** The fields of a section, each with a place for its label, found by sampling. */
export const sectionFields = (
  axis: SectionAxis,
  melting: readonly SectionBoundary[],
  engine: Engine,
): SectionField[] => {
  const top = Math.max(...(melting[0]?.points ?? []).map((p) => p.temperatureC), BOTTOM_C) + HEADROOM_C;
  const fields = new Map<string, { phases: readonly PhaseName[]; cells: Cell[] }>();
  for (let column = 0; column < COLUMNS; column++) {
    const x = axis.xMin + ((column + 0.5) * (axis.xMax - axis.xMin)) / COLUMNS;
    for (let row = 0; row < ROWS; row++) {
      const temperatureC = BOTTOM_C + ((row + 0.5) * (top - BOTTOM_C)) / ROWS;
      const state = equilibrium(axis.compositionAt(x), temperatureC, engine);
      if (!state.withinModel) continue;
      const phases = state.phases.map((phase) => phase.name);
      const field = fields.get(nameOf(phases)) ?? { phases, cells: [] };
      field.cells.push({ x, temperatureC, column, row });
      fields.set(nameOf(phases), field);
    }
  }
  const all = [...fields.values()];
  return all.flatMap(({ phases, cells }) => {
    const others = all.filter((f) => f.cells !== cells).flatMap((f) => f.cells);
    const middle = middleOf(cells, others);
    return middle ? [{ phases, at: { x: middle.x, temperatureC: middle.temperatureC } }] : [];
  });
};
