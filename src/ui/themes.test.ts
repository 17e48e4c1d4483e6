import { describe, expect, it } from 'vitest';
import { themes, type ColourToken } from '../../tailwind.config.ts';
import { contrast } from './contrast.ts';

const textTokens = ['ink', 'soft', 'ember', 'iron', 'brass', 'silver', 'ok'] as const;

const pairs: readonly (readonly [ColourToken, ColourToken])[] = [
  ...textTokens.flatMap((text) => [[text, 'ground'] as const, [text, 'panel'] as const]),
  ['on-ember', 'ember'],
  ['ground', 'ink'],
  ['brass', 'brass-soft'],
  ['silver', 'silver-soft'],
  ['ink', 'ember-soft'],
  ['iron', 'iron-soft'],
];

const shapes = ['ember-fill', 'brass-fill', 'silver-fill', 'iron'] as const;

describe('contrast', () => {
  it('gives the two ends of the scale of WCAG 2.2', () => {
    expect(contrast('#000000', '#ffffff')).toBeCloseTo(21, 6);
    expect(contrast('#777777', '#777777')).toBe(1);
  });

  it('gives 4.48:1 for #777777 on white, the best-known near miss of 4.5:1', () => {
    expect(contrast('#777777', '#ffffff')).toBeCloseTo(4.48, 2);
  });
});

describe.each(Object.entries(themes))('theme %s', (_name, theme) => {
  it.each(pairs)('%s on %s is text at 7:1 or better', (text, ground) => {
    expect(contrast(theme[text], theme[ground])).toBeGreaterThanOrEqual(7);
  });

  it.each(shapes)('%s is a shape at 3:1 or better on panels', (shape) => {
    expect(contrast(theme[shape], theme.panel)).toBeGreaterThanOrEqual(3);
  });
});
