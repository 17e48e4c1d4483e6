import { equilibrium, type Section, type SectionPoint } from '#shared/metallurgy/index.ts';

/** Neighbours further apart than this are joined by more points, °C. */
const stepC = 8;
/** How far beside the straight line between two points the melt is asked, toward the liquid, wt%. */
const asideWt = 1;

const solidXAt = (section: Section, x: number, temperatureC: number): number | null => {
  const { request, xElement } = section;
  if (request.kind !== 'binary' || x <= section.xMin || x >= section.xMax) return null;
  const [first, second] = request.elements;
  const state = equilibrium({ [first]: 100 - x, [second]: x }, temperatureC);
  if (!state.withinModel || !state.phases.some(({ name }) => name === 'liquid')) return null;
  const solid = state.phases.find(({ name }) => name !== 'liquid');
  return solid ? (solid.wt[xElement] ?? 0) : null;
};

const between = (section: Section, a: SectionPoint, b: SectionPoint): readonly SectionPoint[] => {
  const count = Math.floor(Math.abs(b.temperatureC - a.temperatureC) / stepC);
  return Array.from({ length: count }, (_, k) => (k + 1) / (count + 1)).flatMap((part) => {
    const temperatureC = a.temperatureC + part * (b.temperatureC - a.temperatureC);
    const straight = a.x + part * (b.x - a.x);
    for (const aside of [asideWt, -asideWt]) {
      const x = solidXAt(section, straight + aside, temperatureC);
      if (x !== null && Math.abs(x - straight) < asideWt) return [{ x, temperatureC }];
    }
    return [];
  });
};

/**
 * A binary's solidus with points put in where it is steep: there a step along the composition leaves corners, but the
 * solid end of the tie line at each temperature lies on it.
 */
export const refineSolidus = (section: Section): Section => {
  if (section.request.kind !== 'binary') return section;
  const corners = section.invariants.flatMap(({ temperatureC, fromX, toX }) => [
    { x: fromX, temperatureC },
    { x: toX, temperatureC },
  ]);
  const boundaries = section.boundaries.map((line) => {
    if (line.name !== 'solidus') return line;
    const points = [...line.points, ...corners].sort((a, b) => a.x - b.x);
    const fine = points.flatMap((point, index) => {
      const next = points[index + 1];
      return next ? [point, ...between(section, point, next)] : [point];
    });
    return { ...line, points: fine };
  });
  return { ...section, boundaries };
};
