import { render, screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { CastingTree, type TreeStep } from './casting-tree.tsx';

const steps: readonly TreeStep[] = [
  { key: 'guard', label: 'Guard', state: 'done' },
  { key: 'charge', label: 'Charge', state: 'done' },
  { key: 'melt', label: 'Melt', state: 'current' },
  { key: 'pour', label: 'Pour', state: 'todo' },
];

describe('CastingTree', () => {
  it('is an ordered list of its steps, each with its state', () => {
    render(<CastingTree steps={steps} />);
    const items = within(screen.getByRole('list', { name: 'Steps' })).getAllByRole('listitem');
    expect(items.map((item) => item.textContent)).toEqual([
      'Guard, done',
      'Charge, done',
      'Melt, now',
      'Pour, to come',
    ]);
  });

  it('marks only the current step as such', () => {
    render(<CastingTree steps={steps} />);
    const current = screen.getAllByRole('listitem').filter((item) => item.ariaCurrent === 'step');
    expect(current.map((item) => item.textContent)).toEqual(['Melt, now']);
  });

  it('draws one bud for each step, in the state of the step', () => {
    const { container } = render(<CastingTree steps={steps} />);
    const buds = [...container.querySelectorAll('[data-part="bud"]')];
    expect(buds.map((bud) => bud.getAttribute('data-state'))).toEqual(['done', 'done', 'current', 'todo']);
  });

  it('names the step in hand and counts it', () => {
    render(<CastingTree steps={steps} />);
    expect(screen.getByText('3 of 4')).toBeInTheDocument();
  });
});
