import { fireEvent, render, screen } from '@testing-library/react';
import { userEvent } from '@testing-library/user-event';
import { describe, expect, it, vi } from 'vitest';
import { Button } from './button.tsx';
import { Dialog } from './dialog.tsx';

const show = (dismissible?: boolean) => {
  const onClose = vi.fn();
  render(
    <Dialog open title="Why stop?" onClose={onClose} dismissible={dismissible}>
      <p>Say what is wrong.</p>
    </Dialog>,
  );
  return { onClose, dialog: screen.getByRole('dialog', { name: 'Why stop?' }) };
};

describe('Dialog', () => {
  it('asks its parent to close on Escape, on its cross and on a press outside', async () => {
    const { onClose, dialog } = show();
    const escape = new Event('cancel', { cancelable: true });
    fireEvent(dialog, escape);
    expect(escape.defaultPrevented).toBe(true);
    expect(onClose).toHaveBeenCalledTimes(1);
    await userEvent.click(screen.getByRole('button', { name: 'Close' }));
    expect(onClose).toHaveBeenCalledTimes(2);
    await userEvent.click(dialog);
    expect(onClose).toHaveBeenCalledTimes(3);
  });

  it('stays when its content is pressed', async () => {
    const { onClose } = show();
    await userEvent.click(screen.getByText('Say what is wrong.'));
    expect(onClose).not.toHaveBeenCalled();
  });

  it('that must be answered has no cross and no way out by a press outside', async () => {
    const { onClose, dialog } = show(false);
    expect(screen.queryByRole('button', { name: 'Close' })).toBeNull();
    await userEvent.click(dialog);
    expect(onClose).not.toHaveBeenCalled();
  });

  it('begins at the first field, or else at the main action, never at its cross', () => {
    const { rerender } = render(
      <Dialog
        open
        title="Which?"
        onClose={vi.fn()}
        actions={
          <>
            <Button>Not yet</Button>
            <Button kind="main">Do it</Button>
          </>
        }
      >
        <p>Choose.</p>
      </Dialog>,
    );
    expect(screen.getByRole('button', { name: 'Do it' })).toHaveFocus();
    rerender(
      <Dialog key="field" open title="Why?" onClose={vi.fn()} actions={<Button kind="main">Store</Button>}>
        <input aria-label="Reason" />
      </Dialog>,
    );
    expect(screen.getByRole('textbox', { name: 'Reason' })).toHaveFocus();
  });
});
