import type { Section, SectionInvariant, SectionPoint } from '#shared/metallurgy/index.ts';
import type { DiagramField, DiagramLine } from '#src/ui/section-diagram.tsx';
import { elementName } from './element-names.ts';
import type { SectionStudy } from './alloy-study.ts';

/** A section's fields and lines, in wt% and °C, for the diagram to draw; later fields lie over earlier ones. */
export interface SectionDrawing {
  readonly fields: readonly DiagramField[];
  readonly lines: readonly DiagramLine[];
}

interface Melting {
  readonly liquidus: readonly SectionPoint[];
  readonly solidus: readonly SectionPoint[];
  readonly solvus: readonly (readonly SectionPoint[])[];
}

const byX = (a: SectionPoint, b: SectionPoint): number => a.x - b.x;

const eutecticOf = ({ invariants }: Section): SectionInvariant | undefined =>
  invariants.find(({ name }) => name === 'eutectic');

/** The melting lines, with the lowest liquid put in: a step along the composition passes it by. */
const meltingOf = (section: Section): Melting => {
  const pointsOf = (name: string) =>
    section.boundaries.filter((line) => line.name === name).map((line) => line.points);
  const lowest = section.invariants.map(({ liquidX, temperatureC }) => ({ x: liquidX, temperatureC }));
  return {
    liquidus: [...(pointsOf('liquidus')[0] ?? []), ...lowest].sort(byX),
    solidus: pointsOf('solidus')[0] ?? [],
    solvus: pointsOf('solvus'),
  };
};

const liquidField = ({ liquidus }: Melting, highC: number): DiagramField => ({
  kind: 'liquid',
  words: 'liquid',
  outline: [
    ...liquidus,
    { x: liquidus.at(-1)?.x ?? 0, temperatureC: highC },
    { x: liquidus[0]?.x ?? 0, temperatureC: highC },
  ],
});

const upTo = (points: readonly SectionPoint[], x: number) => points.filter((point) => point.x <= x);
const from = (points: readonly SectionPoint[], x: number) => points.filter((point) => point.x >= x);

/** The five fields under the liquid of a binary with a eutectic, named by the two metals. */
const eutecticFields = (
  section: Section,
  { liquidus, solidus, solvus }: Melting,
  { fromX, liquidX, toX }: SectionInvariant,
): readonly DiagramField[] => {
  if (section.request.kind !== 'binary') return [];
  const [first, second] = section.request.elements.map(elementName);
  const [poor = [], rich = []] = solvus;
  const poorDown = poor.toReversed();
  const floor = (poor[0] ?? solidus[0])?.temperatureC ?? 0;
  return [
    {
      kind: 'solid',
      words: `${first}, solid`,
      outline: [...upTo(solidus, fromX), ...poorDown, { x: section.xMin, temperatureC: floor }],
    },
    {
      kind: 'solid',
      words: `${second}, solid`,
      outline: [...from(solidus, toX), { x: section.xMax, temperatureC: floor }, ...rich.toReversed()],
    },
    { kind: 'two-solids', words: `${first} + ${second}, both solid`, outline: [...poor, ...rich] },
    {
      kind: 'mushy',
      words: `${first} + liquid`,
      outline: [...upTo(liquidus, liquidX), ...upTo(solidus, fromX).toReversed()],
    },
    {
      kind: 'mushy',
      words: `${second} + liquid`,
      outline: [...from(liquidus, liquidX), ...from(solidus, toX).toReversed()],
    },
  ];
};

/** The field under a solvus; where the solvus is broken by the solidus, its roof runs along the solidus between. */
const splitField = ({ solidus, solvus }: Melting, lowC: number): readonly DiagramField[] => {
  const [first, second] = solvus;
  if (!first) return [];
  const gap = second ? solidus.filter(({ x }) => x > (first.at(-1)?.x ?? 0) && x < (second[0]?.x ?? 0)) : [];
  const roof = [...first, ...gap, ...(second ?? [])];
  const floor = Math.min(lowC, ...roof.map(({ temperatureC }) => temperatureC));
  return [
    {
      kind: 'two-solids',
      words: 'silver-rich + copper-rich, both solid',
      shortWords: 'two solids',
      outline: [
        ...roof,
        { x: roof.at(-1)?.x ?? 0, temperatureC: floor },
        { x: roof[0]?.x ?? 0, temperatureC: floor },
      ],
    },
  ];
};

const roofField = ({ solidus }: Melting, roof: readonly SectionPoint[]): readonly DiagramField[] => {
  const [start, end] = [roof[0], roof.at(-1)];
  if (roof.length < 2 || !start || !end) return [];
  const below = solidus.filter(({ x }) => x >= start.x && x <= end.x);
  return [{ kind: 'three-phases', words: 'liquid + two solids', outline: [...roof, ...below.toReversed()] }];
};

/** The fields under the liquid of a section whose solid is one solution when hot. */
const solutionFields = (
  melting: Melting,
  roof: readonly SectionPoint[],
  lowC: number,
): readonly DiagramField[] => {
  const { liquidus, solidus } = melting;
  const [start, end] = [solidus[0]?.x ?? 0, solidus.at(-1)?.x ?? 0];
  return [
    {
      kind: 'solid',
      words: 'solid',
      outline: [...solidus, { x: end, temperatureC: lowC }, { x: start, temperatureC: lowC }],
    },
    ...splitField(melting, lowC),
    { kind: 'mushy', words: 'solid + liquid', outline: [...liquidus, ...solidus.toReversed()] },
    ...roofField(melting, roof),
  ];
};

/** Turns a computed section into fields and lines to draw between `lowC` and `highC`. */
export const sectionDrawing = (
  { section, roof }: SectionStudy,
  lowC: number,
  highC: number,
): SectionDrawing => {
  const melting = meltingOf(section);
  const eutectic = eutecticOf(section);
  const fields = eutectic ? eutecticFields(section, melting, eutectic) : solutionFields(melting, roof, lowC);
  return {
    fields: [liquidField(melting, highC), ...fields],
    lines: [
      { name: 'liquidus', points: melting.liquidus },
      { name: 'solidus', points: melting.solidus },
      ...melting.solvus.map((points) => ({ name: 'solvus', points })),
      ...(roof.length > 1 ? [{ name: 'three phases', points: roof }] : []),
    ],
  };
};
