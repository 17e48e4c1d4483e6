import { render, screen } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { describe, expect, it, vi } from 'vitest';
import { Button } from './button.tsx';

describe('Button', () => {
  it('acts when pressed', async () => {
    const onClick = vi.fn();
    render(<Button onClick={onClick}>Save</Button>);
    await userEvent.click(screen.getByRole('button', { name: 'Save' }));
    expect(onClick).toHaveBeenCalledOnce();
  });

  it.each([{ kind: 'blocked' as const }, { busy: true }])(
    'takes no press when %j, yet keeps the focus',
    async (look) => {
      const onClick = vi.fn();
      const onSubmit = vi.fn((event: Event) => event.preventDefault());
      const { container } = render(
        <form>
          <Button type="submit" onClick={onClick} {...look}>
            Flask out opens at 980 °C
          </Button>
        </form>,
      );
      container.querySelector('form')?.addEventListener('submit', onSubmit);
      const button = screen.getByRole('button', { name: 'Flask out opens at 980 °C' });
      await userEvent.click(button);
      expect(onClick).not.toHaveBeenCalled();
      expect(onSubmit).not.toHaveBeenCalled();
      expect(button).toHaveFocus();
      expect(button).toHaveAttribute('aria-disabled', 'true');
    },
  );
});
