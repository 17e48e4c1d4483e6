import { fireEvent, render, screen } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { useState } from 'react';
import { describe, expect, it, vi } from 'vitest';
import { NumberPad, type NumberPadProps } from './number-pad.tsx';
import { PinPad } from './pin-pad.tsx';

const Pad = (props: Partial<NumberPadProps>) => {
  const [value, setValue] = useState('');
  return (
    <>
      <NumberPad label="Mass" unit="g" {...props} value={value} onChange={setValue} />
      <p data-testid="raw">{value}</p>
      <input aria-label="note" />
    </>
  );
};

const Pin = ({ onEnter }: { readonly onEnter?: () => void }) => {
  const [value, setValue] = useState('');
  return <PinPad label="PIN of Ines" value={value} onChange={setValue} onEnter={onEnter} />;
};

const press = async (...names: readonly string[]): Promise<void> => {
  const user = userEvent.setup();
  for (const name of names) await user.click(screen.getByRole('button', { name }));
};

const raw = (): string => screen.getByTestId('raw').textContent;

describe('NumberPad', () => {
  it('gives the raw characters pressed', async () => {
    render(<Pad />);
    await press('0', '4', '2', 'Decimal point', '5', '0');
    expect(raw()).toBe('042.50');
  });

  it('takes one decimal point, erases the last character and clears all', async () => {
    render(<Pad />);
    await press('1', 'Decimal point', 'Decimal point', '2', 'Decimal point');
    expect(raw()).toBe('1.2');
    await press('Erase the last digit');
    expect(raw()).toBe('1.');
    await press('Clear');
    expect(raw()).toBe('');
  });

  it('hears a keyboard, and reads a comma as the decimal point', async () => {
    render(<Pad />);
    await userEvent.keyboard('12,5abc-');
    expect(raw()).toBe('12.5');
    await userEvent.keyboard('{Backspace}');
    expect(raw()).toBe('12.');
    await userEvent.keyboard('{Delete},7');
    expect(raw()).toBe('0.7');
  });

  it('leaves alone what is typed in a field', async () => {
    render(<Pad />);
    await userEvent.type(screen.getByLabelText('note'), '12');
    expect(raw()).toBe('');
  });

  it('stops at its longest and has no decimal key when it takes codes', async () => {
    render(<Pad decimals={false} maxLength={4} />);
    await userEvent.keyboard('01.47,9');
    expect(raw()).toBe('0147');
    expect(screen.queryByRole('button', { name: 'Decimal point' })).toBeNull();
  });

  it('passes Enter on once, and not the Enter that presses one of its keys', () => {
    const onEnter = vi.fn();
    render(<Pad onEnter={onEnter} />);
    fireEvent.keyDown(document.body, { key: 'Enter' });
    fireEvent.keyDown(screen.getByRole('button', { name: '7' }), { key: 'Enter' });
    expect(onEnter).toHaveBeenCalledOnce();
  });
});

describe('PinPad', () => {
  it('shows how many digits were typed and never which', async () => {
    const { container } = render(<Pin />);
    await userEvent.keyboard('739.');
    expect(screen.getByText('3 digits typed')).toBeInTheDocument();
    const shown = container.querySelector('output')?.textContent;
    expect(shown).toBe('3 digits typed');
  });

  it('passes Enter on', async () => {
    const onEnter = vi.fn();
    render(<Pin onEnter={onEnter} />);
    await userEvent.keyboard('123456{Enter}');
    expect(onEnter).toHaveBeenCalledOnce();
  });
});
