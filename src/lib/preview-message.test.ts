import { describe, expect, it } from 'vitest';
import { defaultInstruction } from '#shared/domain/instruction/default-instruction.ts';
import { isPreviewMessage, previewReady } from './preview-message.ts';

describe('isPreviewMessage', () => {
  it('knows an instruction', () => {
    expect(isPreviewMessage(defaultInstruction)).toBe(true);
  });

  it.each([
    [null],
    [previewReady],
    [{ ...defaultInstruction, steps: 'none' }],
    [{ ...defaultInstruction, sentences: { guard: 'Check.' } }],
    [{ ...defaultInstruction, title: 7 }],
  ])('passes over %j', (data) => {
    expect(isPreviewMessage(data)).toBe(false);
  });
});
