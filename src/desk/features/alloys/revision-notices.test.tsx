import { render, screen } from '@testing-library/react';
import { MemoryRouter } from 'react-router-dom';
import { describe, expect, it } from 'vitest';
import type { Alloy, AlloyRevision } from '#shared/contracts/alloy.ts';
import { RevisionNotices } from './revision-notices.tsx';
import { RevisionStatusMark } from './revision-status.tsx';

const revision = {
  id: 'one',
  number: 1,
  status: 'approved',
  drift: ['Solidus: 803.0 °C when approved, 806.4 °C with engine 2.0.0.'],
} as unknown as AlloyRevision;
const draft = { id: 'two', number: 2, status: 'draft', drift: [] } as unknown as AlloyRevision;
const alloyOf = (revisions: readonly AlloyRevision[], revise = true): Alloy => ({
  id: 'alloy',
  name: 'Sterling',
  family: 'silver',
  revisions,
  abilities: { revise },
});

const show = (alloy: Alloy, shown: AlloyRevision) =>
  render(
    <MemoryRouter>
      <RevisionStatusMark revision={shown} />
      <RevisionNotices alloy={alloy} revision={shown} />
    </MemoryRouter>,
  );

describe('RevisionNotices', () => {
  it('asks for a new approval when the engine has changed a figure, says which, and leads to the draft', () => {
    show(alloyOf([revision]), revision);
    expect(screen.getByText('approved, re-approval asked')).toBeInTheDocument();
    expect(screen.getByText(/803\.0 °C when approved, 806\.4 °C/)).toBeInTheDocument();
    expect(screen.getByRole('link', { name: /Draft it again/ })).toHaveAttribute(
      'href',
      '/alloys/alloy?revision=1&form=revision',
    );
  });

  it('offers no draft to someone who may not revise', () => {
    show(alloyOf([revision], false), revision);
    expect(screen.queryByRole('link')).toBeNull();
  });

  it('points to a newer revision under way', () => {
    const calm = { ...revision, drift: [] };
    show(alloyOf([draft, calm]), calm);
    expect(screen.getByText('Revision 2 is a draft, waiting to be checked.')).toBeInTheDocument();
    expect(screen.getByRole('link', { name: 'See revision 2' })).toHaveAttribute(
      'href',
      '/alloys/alloy?revision=2',
    );
  });

  it('says nothing where there is nothing to say', () => {
    show(alloyOf([draft]), draft);
    expect(screen.queryByRole('status')).toBeNull();
  });
});
