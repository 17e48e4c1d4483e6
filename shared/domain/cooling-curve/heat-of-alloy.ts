import type { Celsius } from '#shared/lib/units.ts';
import { freezingPath, type Composition, type FreezingRule } from '#shared/metallurgy/index.ts';

/**
 * Heat of fusion, J/g, and heat capacity near the melting point, J/(g K), of the elements of the model. From the SGTE
 * data for pure elements (Dinsdale 1991) by molar mass, from memory; mixing is taken as additive by mass.
 */
const thermal: Readonly<Record<string, { readonly fusion: number; readonly capacity: number }>> = {
  Ag: { fusion: 104.7, capacity: 0.3 },
  Au: { fusion: 63.7, capacity: 0.157 },
  Cu: { fusion: 208.7, capacity: 0.494 },
  Zn: { fusion: 112, capacity: 0.48 },
};

/** The heat an alloy holds against temperature, in °C of its liquid: what it gives up over its heat capacity. */
export interface HeatOfAlloy {
  readonly liquidusC: Celsius;
  /** Where the last liquid goes, or the lowest temperature the path is known to. */
  readonly endC: Celsius;
  readonly heatAt: (temperatureC: Celsius) => number;
  readonly temperatureOf: (heat: number) => Celsius;
}

interface Node {
  readonly heat: number;
  readonly temperatureC: Celsius;
}

const mixed = (composition: Composition, key: 'fusion' | 'capacity'): number =>
  Object.entries(composition).reduce(
    (total, [element, wt]) => total + wt * (thermal[element]?.[key] ?? 0),
    0,
  ) / 100;

const between = (nodes: readonly Node[], wanted: number, from: keyof Node, to: keyof Node): number => {
  let low = 0;
  let high = nodes.length - 1;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if ((nodes[middle]?.[from] ?? 0) > wanted) low = middle;
    else high = middle;
  }
  const [a, b] = [nodes[low], nodes[high]];
  if (!a || !b) return Number.NaN;
  const span = b[from] - a[from];
  return span === 0 ? b[to] : a[to] + ((wanted - a[from]) / span) * (b[to] - a[to]);
};

/** The heat of an alloy along its freezing path; null where the model does not hold the alloy. */
export const heatOfAlloy = (composition: Composition, rule: FreezingRule): HeatOfAlloy | null => {
  const path = freezingPath(composition, { rule, stepC: 1 });
  if (!path.withinModel) return null;
  const latent = mixed(composition, 'fusion') / mixed(composition, 'capacity');
  const nodes = path.points.map(({ temperatureC, solidMassFraction }) => ({
    temperatureC,
    heat: temperatureC - latent * solidMassFraction,
  }));
  const [first, last] = [nodes[0], nodes.at(-1)];
  if (!first || !last) return null;
  return {
    liquidusC: first.temperatureC,
    endC: last.temperatureC,
    heatAt: (temperatureC) => {
      if (temperatureC >= first.temperatureC) return temperatureC;
      if (temperatureC <= last.temperatureC) return temperatureC + last.heat - last.temperatureC;
      return between(nodes, temperatureC, 'temperatureC', 'heat');
    },
    temperatureOf: (heat) => {
      if (heat >= first.heat) return heat;
      if (heat <= last.heat) return heat - last.heat + last.temperatureC;
      return between(nodes, heat, 'heat', 'temperatureC');
    },
  };
};
