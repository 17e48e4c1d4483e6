import { describe, expect, it } from 'vitest';
import { closeOutRequest } from '#shared/contracts/charge.ts';
import { formSchema } from '#src/desk/parts/form-schema.ts';
import { allButton, castingsMg, closeOutReading } from './close-out-values.ts';

describe('a close-out', () => {
  it('begins with all of it as the button, in the studio’s unit, and nothing in castings', () => {
    const values = allButton(50, 'dwt');
    expect(values.button).toBe('32.1507');
    expect(castingsMg(values, 50, 'dwt')).toBe(0);
  });

  it('gives the castings what is neither button nor loss, and says when too much is named', () => {
    expect(castingsMg({ button: '12,5', loss: '0.1', note: '' }, 50, 'g')).toBe(37_400);
    expect(castingsMg({ button: '51', loss: '0', note: '' }, 50, 'g')).toBe(-1000);
    expect(castingsMg({ button: 'all', loss: '0', note: '' }, 50, 'g')).toBeNull();
  });

  it('wants words on what became of it', () => {
    const read = formSchema(closeOutRequest, closeOutReading('g'));
    const faults = read.safeParse({ ...allButton(50, 'g'), loss: 'x' }).error?.issues;
    expect(faults?.map(({ path }) => path.join('.'))).toEqual(['loss', 'note']);
    expect(read.parse({ ...allButton(50, 'g'), note: 'Let freeze.' })).toMatchObject({
      buttonG: 50,
      lossG: 0,
    });
  });
});
