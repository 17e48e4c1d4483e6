import { render, screen, within } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { describe, expect, it } from 'vitest';
import { FigureBasis } from './figure-basis.tsx';

const basis = {
  rule: 'Liquidus plus superheat.',
  inputs: [
    { label: 'Liquidus', value: '901 °C' },
    { label: 'Superheat', value: '94 °C' },
  ],
  source: 'Studio table of superheats, revision 2.',
};

describe('FigureBasis', () => {
  it('shows rule, inputs and source when pressed, and goes away again', async () => {
    const user = userEvent.setup();
    render(<FigureBasis label="Pour temperature" value="995 °C" basis={basis} />);
    expect(screen.queryByRole('dialog')).toBeNull();
    await user.click(screen.getByRole('button', { name: /Pour temperature.*995 °C/ }));
    const dialog = within(screen.getByRole('dialog', { name: 'Pour temperature: 995 °C' }));
    expect(dialog.getByText('Liquidus plus superheat.')).toBeInTheDocument();
    expect(dialog.getByText('901 °C')).toBeInTheDocument();
    expect(dialog.getByText('Studio table of superheats, revision 2.')).toBeInTheDocument();
    await user.click(dialog.getByRole('button', { name: 'Close' }));
    expect(screen.queryByRole('dialog')).toBeNull();
  });
});
