import { QueryClientProvider } from '@tanstack/react-query';
import { render, screen } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { problemType, type Problem } from '#shared/contracts/problem.ts';
import { createQueryClient } from '#src/lib/query-client.ts';
import { SignInForm } from './sign-in-form.tsx';

afterEach(() => vi.unstubAllGlobals());

/** What the server will answer, in place of a network. */
const answer = (problem: Problem) =>
  vi.stubGlobal('fetch', () =>
    Promise.resolve(new Response(JSON.stringify(problem), { status: problem.status })),
  );

const show = () =>
  render(
    <QueryClientProvider client={createQueryClient()}>
      <SignInForm />
    </QueryClientProvider>,
  );

const type = async (): Promise<void> => {
  await userEvent.type(screen.getByLabelText('Name'), 'maren');
  await userEvent.type(screen.getByLabelText('Password'), 'not the one');
  await userEvent.click(screen.getByRole('button', { name: 'Sign in' }));
};

describe('SignInForm', () => {
  it('asks for what is missing before it asks the server', async () => {
    const fetch = vi.fn();
    vi.stubGlobal('fetch', fetch);
    show();
    await userEvent.click(screen.getByRole('button', { name: 'Sign in' }));
    expect(await screen.findByText('Type your sign-in name.')).toBeInTheDocument();
    expect(fetch).not.toHaveBeenCalled();
  });

  it('says why it was refused and keeps what was typed', async () => {
    answer({
      type: problemType('wrong-sign-in'),
      title: 'Name and password do not belong together.',
      status: 401,
    });
    show();
    await type();
    expect(await screen.findByText('Name and password do not belong together.')).toBeInTheDocument();
    expect(screen.getByLabelText('Name')).toHaveValue('maren');
    expect(screen.getByLabelText('Password')).toHaveValue('not the one');
  });

  it('counts the wait down and opens again by itself', async () => {
    answer({ type: problemType('sign-in-delayed'), title: 'Too many.', status: 429, retryAfterS: 2 });
    show();
    await type();
    expect(await screen.findByText(/You can try again in [12] seconds?\./)).toBeInTheDocument();
    expect(screen.getByRole('button')).toHaveAttribute('aria-disabled', 'true');
    expect(await screen.findByRole('button', { name: 'Sign in' }, { timeout: 4000 })).not.toHaveAttribute(
      'aria-disabled',
    );
  });
});
