import { fireEvent, render, screen } from '@testing-library/react';
import { useState } from 'react';
import { describe, expect, it } from 'vitest';
import { tieLine } from '#shared/metallurgy/index.ts';
import { diagramFrame, diagramScales } from '#src/ui/section-diagram-frame.ts';
import type { StudioWriting } from '../../parts/use-studio.ts';
import { studioClock } from '../../parts/studio-clock.ts';
import { runStudy } from './alloy-study.ts';
import { SectionPicture } from './section-picture.tsx';
import { sectionSpan } from './temperature-span.ts';

const answer = runStudy('section', { request: { kind: 'binary', elements: ['Ag', 'Cu'] } });
if (!answer.withinModel) throw new Error(answer.reason);
const study = answer;

const studio: StudioWriting = {
  clock: studioClock('UTC'),
  units: { temperature: 'C', mass: 'g' },
  temperature: (celsius) => `${Math.round(celsius)} °C`,
  degrees: (celsius) => String(Math.round(celsius)),
  mass: (grams) => `${grams} g`,
};

const Picture = () => {
  const [atC, setAtC] = useState(850);
  return (
    <SectionPicture
      study={study}
      width={880}
      x={7.5}
      toleranceWt={0.3}
      solvusC={758}
      band={null}
      temperature={{ atC, move: setAtC, settle: setAtC }}
      studio={studio}
      spoken="Silver-rich solid and liquid."
    />
  );
};

const scales = diagramScales(diagramFrame(880), { xMin: 0, xMax: 100, ...sectionSpan(study.section, 758) });
const beam = () => document.querySelector('[data-part="beam"]');

describe('SectionPicture', () => {
  it('draws the beam between the two boundaries at the temperature', () => {
    render(<Picture />);
    const tie = tieLine(study.section, 7.5, 850);
    const ends = tie.withinModel ? tie.ends.map(({ x }) => scales.x(x)).sort((a, b) => a - b) : [];
    expect(Number(beam()?.getAttribute('data-from'))).toBeCloseTo(ends[0] ?? NaN, 6);
    expect(Number(beam()?.getAttribute('data-to'))).toBeCloseTo(ends[1] ?? NaN, 6);
  });

  it('moves by the keys, one degree or ten, and says where it stands', () => {
    render(<Picture />);
    const slider = screen.getByRole('slider', { name: 'Temperature' });
    expect(slider).toHaveAttribute('aria-valuetext', '850 °C. Silver-rich solid and liquid.');
    fireEvent.keyDown(slider, { key: 'ArrowUp' });
    expect(slider).toHaveAttribute('aria-valuenow', '851');
    fireEvent.keyDown(slider, { key: 'ArrowDown', shiftKey: true });
    expect(slider).toHaveAttribute('aria-valuenow', '841');
  });

  it('has no beam where the metal is of one phase', () => {
    render(<Picture />);
    fireEvent.keyDown(screen.getByRole('slider'), { key: 'End' });
    expect(beam()).toBeNull();
  });

  it('shows the alloy’s own line with its tolerance to scale', () => {
    render(<Picture />);
    const strip = document.querySelector('[data-part="tolerance"]');
    expect(Number(strip?.getAttribute('width'))).toBeCloseTo(scales.x(7.8) - scales.x(7.2), 6);
  });

  it('writes the invariant line with its temperature', () => {
    render(<Picture />);
    expect(screen.getByText('779 °C, three phases, nothing free')).toBeInTheDocument();
  });
});
