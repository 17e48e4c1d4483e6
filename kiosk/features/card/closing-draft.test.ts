import { describe, expect, it } from 'vitest';
import { emptyClosing, judgeClosing } from './closing-draft.ts';

const filled = { ...emptyClosing, button: '4,2', loss: '0', look: 'full' } as const;

describe('judgeClosing', () => {
  it('makes metal in equal metal out', () => {
    const closing = judgeClosing(filled, 84.08, 'g');
    expect(closing).toEqual({
      ready: true,
      castG: 79.88,
      event: { type: 'closed', buttonMassG: 4.2, lossMassG: 0, look: 'full', note: '' },
    });
  });

  it.each([
    [{ button: '' }, 'Weigh the button first'],
    [{ loss: '' }, 'Enter spill and loss, 0 for none'],
    [{ button: '-1' }, 'A mass cannot be below zero.'],
    [{ button: '90' }, 'More out than went in: weigh again'],
    [{ look: null }, 'Choose how the casting looks'],
  ])('waits with %o', (change, waitsFor) => {
    expect(judgeClosing({ ...filled, ...change }, 84.08, 'g')).toMatchObject({ ready: false, waitsFor });
  });
});
