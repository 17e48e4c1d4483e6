/** An element the phase model holds. */
export type ElementSymbol = 'Ag' | 'Au' | 'Cu' | 'Zn';

/** Mass percentages by element symbol; may hold elements outside the model. */
export type Composition = Readonly<Record<string, number>>;

/** Values by element symbol, for the elements of one alloy in the model's own order. */
export type ByElement = Readonly<Record<string, number>>;

/** Why a question has no answer, as a stable code. */
export type RefusalCode =
  | 'composition-sum'
  | 'unknown-element'
  | 'negative'
  | 'not-a-number'
  | 'outside-model'
  | 'phase-outside-model'
  | 'temperature'
  | 'option';

/** A typed refusal; `reason` is one clear sentence fit for a screen. */
export interface Refusal {
  readonly withinModel: false;
  readonly code: RefusalCode;
  readonly reason: string;
}

/** An answer, or the reason there is none. */
export type Outcome<T> = (T & { readonly withinModel: true }) | Refusal;

/** The two rules by which an alloy may freeze: full diffusion in the solid, or none. */
export type FreezingRule = 'lever' | 'scheil';

/** What a phase is called: `fcc` alone, or by its richer side where fcc has split in two. */
export type PhaseName = 'liquid' | 'fcc' | 'silver-rich fcc' | 'copper-rich fcc';

/** One phase at equilibrium: fractions of the whole in [0, 1], compositions in wt% and at%. */
export interface Phase {
  readonly name: PhaseName;
  readonly moleFraction: number;
  readonly massFraction: number;
  readonly wt: ByElement;
  readonly at: ByElement;
}

/** The state of least Gibbs energy; `chemicalPotentials` in J/mol, referred to each pure element as fcc at the same temperature. */
export interface EquilibriumState {
  readonly temperatureC: number;
  readonly phases: readonly Phase[];
  readonly liquidMassFraction: number;
  readonly solidMassFraction: number;
  /** By the condensed phase rule, F = C + 1 − P. */
  readonly degreesOfFreedom: number;
  readonly chemicalPotentials: ByElement;
}

/** Melting range, °C. `asCastSolidusC` is null where the last liquid leaves the model; `note` then says so. */
export interface MeltingRange {
  readonly liquidusC: number;
  readonly solidusC: number;
  readonly asCastSolidusC: number | null;
  /** Below this the homogeneous solid splits into two fcc phases; null where it never does, or never is homogeneous. */
  readonly solvusC: number | null;
  readonly note: string | null;
}

/** One point of a freezing path; `solidWt` is the solid forming there, null where there is none yet. */
export interface PathPoint {
  readonly temperatureC: number;
  readonly solidMassFraction: number;
  readonly solidWt: ByElement | null;
  readonly liquidWt: ByElement | null;
}

/** A freezing path from liquidus downwards; `endsC` is where the last liquid goes, null where it leaves the model first. */
export interface FreezingPath {
  readonly rule: FreezingRule;
  readonly points: readonly PathPoint[];
  readonly endsC: number | null;
  readonly note: string | null;
}

/** Fraction solid at one temperature, with the solid forming there and the liquid left. */
export interface SolidFraction {
  readonly solidMassFraction: number;
  readonly solidWt: ByElement | null;
  readonly liquidWt: ByElement | null;
}

/** A section to draw: a two-component system, or a carat section (fixed gold, silver against copper). */
export type SectionRequest =
  | { readonly kind: 'binary'; readonly elements: readonly [ElementSymbol, ElementSymbol] }
  | { readonly kind: 'carat'; readonly goldWt: number };

/** One point of a boundary: wt% of the section's second element against °C. */
export interface SectionPoint {
  readonly x: number;
  readonly temperatureC: number;
}

/** What a boundary separates. */
export type BoundaryName = 'liquidus' | 'solidus' | 'solvus';

/** A line of the section, in order of x. */
export interface SectionBoundary {
  readonly name: BoundaryName;
  readonly points: readonly SectionPoint[];
}

/** A labelled field; `at` is a place inside it fit for the label. */
export interface SectionField {
  readonly phases: readonly PhaseName[];
  readonly at: SectionPoint;
}

/** A horizontal line at which the degrees of freedom are nil, from x to x through the liquid. */
export interface SectionInvariant {
  readonly name: 'eutectic' | 'congruent minimum';
  readonly temperatureC: number;
  readonly fromX: number;
  readonly liquidX: number;
  readonly toX: number;
}

/** A section ready to draw; x is wt% of `xElement`, from `xMin` to `xMax`. */
export interface Section {
  readonly request: SectionRequest;
  readonly xElement: ElementSymbol;
  readonly xMin: number;
  readonly xMax: number;
  readonly boundaries: readonly SectionBoundary[];
  readonly fields: readonly SectionField[];
  readonly invariants: readonly SectionInvariant[];
}

/** The tie line at a place of a section; `inPlane` is false where the phases lie off the section (only a binary holds them all). */
export interface TieLine {
  readonly state: EquilibriumState;
  readonly inPlane: boolean;
  readonly ends: readonly { readonly name: PhaseName; readonly x: number; readonly massFraction: number }[];
}

/** Lowest and highest value met inside the tolerance, °C. */
export interface Band {
  readonly low: number;
  readonly high: number;
}

/** °C moved per +1 wt% of an element, taken in proportion from the rest. */
export interface Sensitivity {
  readonly element: string;
  readonly liquidusCPerWt: number;
  readonly solidusCPerWt: number;
}

/** How far the range may lie for the tolerance of each element. */
export interface RangeBand {
  readonly liquidusC: Band;
  readonly solidusC: Band;
  readonly asCastSolidusC: Band | null;
  readonly sensitivities: readonly Sensitivity[];
  /** How many compositions inside the tolerance were computed. */
  readonly compositions: number;
}
