import { describe, expect, it } from 'vitest';
import { crucibleLayers, type CrucibleLot } from './crucible-layers.ts';

const lot = (key: string, inG: number, plannedG: number): CrucibleLot => ({
  key,
  label: key,
  kind: 'gold',
  inG,
  plannedG,
});

const lots = [lot('returns', 32, 32), lot('gold', 24.1, 39.18), lot('master', 0, 13.02)];

describe('crucibleLayers', () => {
  const { layers, labels, wantedY } = crucibleLayers(lots, 84.2, 60, 400);

  it('stacks what is in below what is to come', () => {
    expect(layers.map((layer) => layer.key)).toEqual(['returns-in', 'gold-in', 'gold-come', 'master-come']);
    expect(layers.map((layer) => layer.isIn)).toEqual([true, true, false, false]);
  });

  it('draws heights by mass, up to the wanted line when the plan adds up to it', () => {
    const [returns, gold] = layers;
    expect((gold?.height ?? 0) / (returns?.height ?? 1)).toBeCloseTo(24.1 / 32, 9);
    expect(layers.at(-1)?.y).toBeCloseTo(wantedY, 9);
  });

  it('names each lot once, from the top down', () => {
    expect(labels.map((label) => label.key)).toEqual(['master', 'gold', 'returns']);
  });

  it('rises over the wanted line when too much is in, and stays inside the pot', () => {
    const over = crucibleLayers([lot('gold', 100, 84.2)], 84.2, 60, 400);
    expect(over.layers[0]?.y).toBeLessThan(over.wantedY);
    expect(over.layers[0]?.y).toBeGreaterThan(60);
  });

  it('is empty without lots', () => {
    expect(crucibleLayers([], 84.2, 60, 400).layers).toEqual([]);
  });
});
