import { act, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { Dialog } from './dialog.tsx';
import { HoldButton } from './hold-button.tsx';

const setUp = (props: { readonly pedalKey?: string; readonly disabled?: boolean } = {}) => {
  const onHeld = vi.fn();
  render(
    <>
      <HoldButton onHeld={onHeld} {...props}>
        Poured
      </HoldButton>
      <input aria-label="note" />
    </>,
  );
  return { onHeld, button: screen.getByRole('button', { name: 'Poured' }) };
};

const pass = (milliseconds: number): void => {
  act(() => {
    vi.advanceTimersByTime(milliseconds);
  });
};

beforeEach(() => vi.useFakeTimers());
afterEach(() => vi.useRealTimers());

describe('HoldButton', () => {
  it('acts once after a hold of 900 ms', () => {
    const { onHeld, button } = setUp();
    fireEvent.pointerDown(button, { button: 0, pointerId: 1 });
    pass(899);
    expect(onHeld).not.toHaveBeenCalled();
    pass(1);
    expect(onHeld).toHaveBeenCalledOnce();
    pass(5000);
    fireEvent.pointerUp(button, { pointerId: 1 });
    expect(onHeld).toHaveBeenCalledOnce();
  });

  it.each(['pointerUp', 'pointerLeave', 'pointerCancel', 'blur'] as const)(
    'does nothing when %s comes early',
    (end) => {
      const { onHeld, button } = setUp();
      fireEvent.pointerDown(button, { button: 0, pointerId: 1 });
      pass(700);
      fireEvent[end](button, { pointerId: 1 });
      pass(5000);
      expect(onHeld).not.toHaveBeenCalled();
      expect(button).toHaveAttribute('data-phase', 'idle');
    },
  );

  it('does nothing on a plain click, nor on many', () => {
    const { onHeld, button } = setUp();
    for (let press = 0; press < 20; press += 1) {
      fireEvent.pointerDown(button, { button: 0, pointerId: 1 });
      pass(80);
      fireEvent.pointerUp(button, { pointerId: 1 });
      fireEvent.click(button);
    }
    pass(5000);
    expect(onHeld).not.toHaveBeenCalled();
  });

  it('is not ended by a second finger that leaves', () => {
    const { onHeld, button } = setUp();
    fireEvent.pointerDown(button, { button: 0, pointerId: 1 });
    fireEvent.pointerDown(button, { button: 0, pointerId: 2 });
    fireEvent.pointerUp(button, { pointerId: 2 });
    pass(900);
    expect(onHeld).toHaveBeenCalledOnce();
  });

  it.each([' ', 'Enter'])('acts when the key %j is held, and not when it is let go early', (key) => {
    const { onHeld, button } = setUp();
    fireEvent.keyDown(button, { key });
    pass(500);
    fireEvent.keyUp(button, { key });
    pass(5000);
    expect(onHeld).not.toHaveBeenCalled();
    fireEvent.keyDown(button, { key });
    fireEvent.keyDown(button, { key, repeat: true });
    pass(900);
    expect(onHeld).toHaveBeenCalledOnce();
  });

  it('says that it must be held, and when to let go', () => {
    const { button } = setUp();
    expect(button).toHaveAccessibleDescription(/press and hold/i);
    fireEvent.pointerDown(button, { button: 0, pointerId: 1 });
    expect(screen.getByRole('status')).toHaveTextContent('Keep holding.');
    pass(900);
    expect(screen.getByRole('status')).toHaveTextContent('Done. Let go.');
  });

  it('does nothing while disabled', () => {
    const { onHeld, button } = setUp({ disabled: true, pedalKey: 'b' });
    fireEvent.pointerDown(button, { button: 0, pointerId: 1 });
    fireEvent.keyDown(window, { key: 'b' });
    pass(5000);
    expect(onHeld).not.toHaveBeenCalled();
  });

  it('forgets a hold that was under way when it was disabled', () => {
    const onHeld = vi.fn();
    const { rerender } = render(<HoldButton onHeld={onHeld}>Poured</HoldButton>);
    fireEvent.pointerDown(screen.getByRole('button'), { button: 0, pointerId: 1 });
    pass(500);
    rerender(
      <HoldButton onHeld={onHeld} disabled>
        Poured
      </HoldButton>,
    );
    rerender(<HoldButton onHeld={onHeld}>Poured</HoldButton>);
    pass(5000);
    expect(onHeld).not.toHaveBeenCalled();
  });
});

describe('the pedal of a HoldButton', () => {
  it('acts at once, wherever the focus is, and once for one press', () => {
    const { onHeld } = setUp({ pedalKey: 'b' });
    fireEvent.keyDown(document.body, { key: 'b' });
    fireEvent.keyDown(document.body, { key: 'b', repeat: true });
    fireEvent.keyDown(document.body, { key: 'b', repeat: true });
    expect(onHeld).toHaveBeenCalledOnce();
  });

  it('does not hear another key, a shortcut, or what is typed in a field', () => {
    const { onHeld } = setUp({ pedalKey: 'b' });
    fireEvent.keyDown(document.body, { key: 'c' });
    fireEvent.keyDown(document.body, { key: 'b', ctrlKey: true });
    fireEvent.keyDown(screen.getByLabelText('note'), { key: 'b' });
    expect(onHeld).not.toHaveBeenCalled();
  });

  it('is not heard through a dialog that covers the button', () => {
    const { onHeld } = setUp({ pedalKey: 'b' });
    const dialog = render(
      <Dialog open title="Why stop?" onClose={() => undefined}>
        Say what is wrong.
      </Dialog>,
    );
    fireEvent.keyDown(document.body, { key: 'b' });
    expect(onHeld).not.toHaveBeenCalled();
    dialog.unmount();
    fireEvent.keyDown(document.body, { key: 'b' });
    expect(onHeld).toHaveBeenCalledOnce();
  });

  it('and a hold under way count as one', () => {
    const { onHeld, button } = setUp({ pedalKey: 'b' });
    fireEvent.pointerDown(button, { button: 0, pointerId: 1 });
    pass(400);
    fireEvent.keyDown(window, { key: 'b' });
    pass(5000);
    expect(onHeld).toHaveBeenCalledOnce();
  });
});
