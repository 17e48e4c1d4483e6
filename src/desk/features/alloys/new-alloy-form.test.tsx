import { QueryClientProvider } from '@tanstack/react-query';
import { render, screen, within } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { MemoryRouter } from 'react-router-dom';
import { afterEach, describe, expect, it, vi } from 'vitest';
import type { Problem } from '#shared/contracts/problem.ts';
import { createQueryClient } from '#src/lib/query-client.ts';
import { DeskSessionContext, type DeskSession } from '#src/desk/parts/desk-session.ts';
import { NewAlloyForm } from './new-alloy-form.tsx';

const session = {
  person: { id: 'p', name: 'Maren', roles: ['owner'] },
  studio: {
    name: 'Studio',
    units: { temperature: 'C', mass: 'g' },
    idleLockS: 300,
    timeZone: 'UTC',
    marksPlace: 'ISO 9202',
  },
} as unknown as DeskSession;

const open = () => {
  render(
    <QueryClientProvider client={createQueryClient()}>
      <DeskSessionContext value={session}>
        <MemoryRouter>
          <NewAlloyForm />
        </MemoryRouter>
      </DeskSessionContext>
    </QueryClientProvider>,
  );
  return userEvent.setup();
};

const field = (name: string) => screen.getByLabelText(name);

const fillIn = async (user: ReturnType<typeof userEvent.setup>) => {
  await user.type(field('Name'), 'Sterling, trial');
  await user.selectOptions(field('Family'), 'silver');
  await user.type(field('Element 1'), 'Ag');
  await user.type(field('Part of element 1, wt%'), '92,5');
  await user.type(field('Element 2'), 'Cu');
  await user.type(field('Part of element 2, wt%'), '7,5');
  await user.type(field('Fineness'), '930');
  await user.type(field('Earliest'), '15');
  await user.type(field('Why then'), 'It sets through.');
  await user.type(field('Source of the quench rule'), 'A trial.');
};

/** Answers as the server does when a mark is above what the composition holds. */
const refuseFineness = () => {
  const problem: Problem = {
    type: 'urn:ladlemark:problem:invalid-request',
    title: 'Something in the request is not right.',
    status: 400,
    fields: [{ path: 'fineness', message: 'It cannot be marked 930.' }],
  };
  const fetched = vi
    .fn<typeof fetch>()
    .mockImplementation(() => Promise.resolve(Response.json(problem, { status: 400 })));
  vi.stubGlobal('fetch', fetched);
  return fetched;
};

afterEach(() => vi.unstubAllGlobals());

describe('NewAlloyForm', () => {
  it('shows the running sum, and the computed figures once it comes to 100', async () => {
    const user = open();
    await user.type(field('Element 1'), 'Ag');
    await user.type(field('Part of element 1, wt%'), '92,5');
    expect(screen.getByText('Sum 92.5 wt%: 7.5 missing.')).toBeInTheDocument();
    await user.type(field('Element 2'), 'cu');
    await user.type(field('Part of element 2, wt%'), '7.5');
    const figures = within(screen.getByRole('region', { name: 'What it computes to' }));
    expect(await figures.findByText('896 °C')).toBeInTheDocument();
    expect(figures.getByText('779 °C')).toBeInTheDocument();
  });

  it('says in plain words why an alloy is outside the model', async () => {
    const user = open();
    await user.type(field('Element 1'), 'Au');
    await user.type(field('Part of element 1, wt%'), '80');
    await user.type(field('Element 2'), 'Pd');
    await user.type(field('Part of element 2, wt%'), '20');
    const figures = within(screen.getByRole('region', { name: 'What it computes to' }));
    expect(await figures.findByText(/also holds Pd 20 wt%/)).toBeInTheDocument();
  });

  it('sends what was meant, puts the server’s sentence at its field and keeps what was typed', async () => {
    const fetched = refuseFineness();
    const user = open();
    await fillIn(user);
    await user.click(screen.getByRole('button', { name: 'Add the alloy' }));
    expect(await screen.findByText('It cannot be marked 930.')).toBeInTheDocument();
    expect(field('Fineness')).toHaveAttribute('aria-invalid', 'true');
    expect(field('Part of element 1, wt%')).toHaveValue('92,5');
    const body = JSON.parse(fetched.mock.calls[0]?.[1]?.body as string) as unknown;
    expect(body).toMatchObject({
      compositionWt: { Ag: 92.5, Cu: 7.5 },
      quench: { earliestS: 900, latestS: null },
    });
  });

  it('sends nothing while something is wrong, and says it at the field', async () => {
    const fetched = refuseFineness();
    const user = open();
    await user.type(field('Part of element 1, wt%'), 'a lot');
    await user.click(screen.getByRole('button', { name: 'Add the alloy' }));
    expect(await screen.findByText('Use an element symbol, such as Ag.')).toBeInTheDocument();
    expect(screen.getByText('Name the alloy.')).toBeInTheDocument();
    expect(fetched).not.toHaveBeenCalled();
  });
});
