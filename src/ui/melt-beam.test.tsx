import { render, screen } from '@testing-library/react';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { beamGeometry, phasePercents, type MeltBalance } from './beam-geometry.ts';
import { MeltBeam, type MeltBeamProps } from './melt-beam.tsx';

const tie = (alloyWt: number, solidWt: number, liquidWt: number): MeltBalance => ({
  element: 'copper',
  alloyWt,
  solidWt,
  liquidWt,
  solidMassFraction: (liquidWt - alloyWt) / (liquidWt - solidWt),
});

const gold = {
  solidusC: 885,
  liquidusC: 901,
  windowC: { low: 980, high: 1010 },
  rangeC: { low: 800, high: 1060 },
  format: (celsius: number) => String(Math.round(celsius)),
  unit: '°C',
} as const;

const drawBeam = (props: Pick<MeltBeamProps, 'readingC' | 'balance'>) =>
  render(<MeltBeam {...gold} {...props} />).container;

const part = (container: HTMLElement, name: string): Element | null =>
  container.querySelector(`[data-part="${name}"]`);

const attribute = (element: Element | null, name: string): number =>
  Number(element?.getAttribute(name) ?? NaN);

const mass = (radius: number): number => radius ** 2;

const heightOf = (container: HTMLElement, name: string): string =>
  (part(container, name) as SVGElement | null)?.style.transform ?? '';

describe('beamGeometry', () => {
  it('balances: area × arm is equal on both sides of the fulcrum for any tie line', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.1, max: 40, noNaN: true }),
        fc.double({ min: 0.1, max: 40, noNaN: true }),
        fc.double({ min: 0.01, max: 0.99, noNaN: true }),
        fc.boolean(),
        (start, spread, at, rising) => {
          const [solid, liquid] = rising ? [start, start + spread] : [start + spread, start];
          const geometry = beamGeometry(tie(solid + at * (liquid - solid), solid, liquid), {
            left: 50,
            right: 290,
            fullRadius: 54,
          });
          const solidTorque = mass(geometry.solidRadius) * (geometry.fulcrumX - geometry.solidX);
          const liquidTorque = mass(geometry.liquidRadius) * (geometry.liquidX - geometry.fulcrumX);
          expect(solidTorque / liquidTorque).toBeCloseTo(1, 6);
        },
      ),
    );
  });

  it('places the fulcrum by the masses where solid and liquid are of one composition', () => {
    const balance = { ...tie(28, 27, 29), solidWt: 28, liquidWt: 28, solidMassFraction: 0.25 };
    const geometry = beamGeometry(balance, { left: 0, right: 100, fullRadius: 50 });
    expect(geometry.fulcrumX).toBeCloseTo(75, 9);
  });
});

describe('phasePercents', () => {
  it.each([
    [0.507, '51 %', '49 %'],
    [0.004, 'under 1 %', 'over 99 %'],
    [0.996, 'over 99 %', 'under 1 %'],
    [0, '0 %', '100 %'],
  ])('writes a solid share of %d as %s and %s', (share, solid, liquid) => {
    expect(phasePercents(share)).toEqual([solid, liquid]);
  });
});

describe('MeltBeam', () => {
  it('is drawn in balance: the weights, arms and fulcrum on the screen give equal torques', () => {
    const container = drawBeam({ readingC: 892, balance: tie(12.5, 8.9, 16.2) });
    const solid = part(container, 'solid-weight');
    const liquid = part(container, 'liquid-weight');
    const fulcrum = attribute(part(container, 'fulcrum'), 'data-x');
    const left = mass(attribute(solid, 'r')) * (fulcrum - attribute(solid, 'cx'));
    const right = mass(attribute(liquid, 'r')) * (attribute(liquid, 'cx') - fulcrum);
    expect(left).toBeGreaterThan(0);
    expect(left / right).toBeCloseTo(1, 6);
  });

  it('stands level with the pointer of the reading', () => {
    const container = drawBeam({ readingC: 892, balance: tie(12.5, 8.9, 16.2) });
    expect(heightOf(container, 'beam')).toMatch(/^translateY\(\d/);
    expect(heightOf(container, 'beam')).toBe(heightOf(container, 'pointer'));
  });

  it('says in words what it shows', () => {
    drawBeam({ readingC: 892, balance: tie(12.5, 8.9, 16.2) });
    const name = screen.getByRole('img').getAttribute('aria-label');
    expect(name).toContain('Reading 892 °C: partly solid.');
    expect(name).toContain('51 % solid by mass, with 8.9 % copper; 49 % liquid, with 16.2 % copper');
    expect(name).toContain('Pour window 980 °C to 1010 °C.');
  });

  it.each([
    [850, 'solid-weight', 'all solid'],
    [995, 'liquid-weight', 'all liquid'],
  ])('at %d °C stands one weight over the fulcrum', (readingC, weight, words) => {
    const container = drawBeam({ readingC, balance: null });
    expect(attribute(part(container, weight), 'cx')).toBe(attribute(part(container, 'fulcrum'), 'data-x'));
    expect(screen.getByText(words)).toBeInTheDocument();
  });

  it('ignores a tie line left over from another reading once the metal is all liquid', () => {
    const container = drawBeam({ readingC: 995, balance: tie(12.5, 8.9, 16.2) });
    expect(part(container, 'solid-weight')).toBeNull();
  });

  it('shows no weight before the first reading, nor a share it was not given', () => {
    expect(part(drawBeam({ readingC: null, balance: null }), 'pointer')).toBeNull();
    expect(screen.getByText('no reading yet')).toBeInTheDocument();
    const mushy = drawBeam({ readingC: 892, balance: null });
    expect(part(mushy, 'solid-weight')).toBeNull();
    expect(screen.getByText('share not computed')).toBeInTheDocument();
  });
});
