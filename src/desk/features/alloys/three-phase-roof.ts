import { equilibrium, type Composition, type Section, type SectionPoint } from '#shared/metallurgy/index.ts';

const hairC = 0.05;
const toleranceC = 0.05;

const compositionAt = ({ request }: Section, x: number): Composition =>
  request.kind === 'carat'
    ? { Au: request.goldWt, Ag: 100 - request.goldWt - x, Cu: x }
    : { [request.elements[0]]: 100 - x, [request.elements[1]]: x };

const holdsThree = (section: Section, x: number, temperatureC: number): boolean => {
  const state = equilibrium(compositionAt(section, x), temperatureC);
  return state.withinModel && state.phases.length === 3;
};

const roofAt = (
  section: Section,
  { x, temperatureC }: SectionPoint,
  liquidusC: number,
): SectionPoint | null => {
  let low = temperatureC + hairC;
  let high = liquidusC;
  if (high <= low || !holdsThree(section, x, low)) return null;
  while (high - low > toleranceC) {
    const middle = (low + high) / 2;
    if (holdsThree(section, x, middle)) low = middle;
    else high = middle;
  }
  return { x, temperatureC: low };
};

/**
 * The upper edge of the field of a carat section in which liquid stands beside two solids, in order of x; empty where
 * there is none. A binary has no such field: there it shrinks to the eutectic line.
 */
export const threePhaseRoof = (section: Section): readonly SectionPoint[] => {
  if (section.request.kind === 'binary') return [];
  const pointsOf = (name: string) => section.boundaries.find((line) => line.name === name)?.points ?? [];
  const liquidus = new Map(pointsOf('liquidus').map(({ x, temperatureC }) => [x, temperatureC]));
  return pointsOf('solidus').flatMap((point) => {
    const roof = roofAt(section, point, liquidus.get(point.x) ?? point.temperatureC);
    return roof ? [roof] : [];
  });
};
