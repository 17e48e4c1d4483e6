import { COMMITTED } from './model.ts';

/** The engine's version: changes whenever a computed figure may. */
export const ENGINE_VERSION = '1.0.0';

/** Where one set of parameters comes from, for screens. */
export interface ParameterSource {
  readonly what: string;
  readonly basis: string;
  readonly source: string;
}

/** The source of every parameter the engine uses. */
export const PROVENANCE: readonly ParameterSource[] = [
  { what: 'Pure elements: liquid against fcc', basis: 'published', source: COMMITTED.liquidOverFccSource },
  ...COMMITTED.interactions.map(({ elements, basis, source }) => ({
    what: elements.join('-'),
    basis,
    source,
  })),
];
