import { describe, expect, it } from 'vitest';
import { readSheetFile } from './read-sheet-file.ts';

const sentenceOf = async (file: Blob): Promise<string> => {
  const read = await readSheetFile(file);
  return read.ok ? '' : read.error;
};

describe('readSheetFile', () => {
  it('reads UTF-8, and UTF-16 with its mark', async () => {
    expect(await readSheetFile(new Blob(['name;Au ±']))).toEqual({
      ok: true,
      value: { text: 'name;Au ±', remark: '' },
    });
    const wide = new Uint8Array([0xff, 0xfe, 0x41, 0x00, 0x75, 0x00]);
    expect(await readSheetFile(new Blob([wide]))).toMatchObject({ value: { text: 'Au' } });
  });

  it('reads an old spreadsheet’s letters and says that it guessed', async () => {
    const read = await readSheetFile(new Blob([new Uint8Array([0x41, 0x75, 0x20, 0xb1])]));
    expect(read).toMatchObject({
      value: { text: 'Au ±', remark: expect.stringContaining('Windows-1252') as string },
    });
  });

  it.each([
    ['a workbook', new Uint8Array([0x50, 0x4b, 3, 4]), 'a workbook'],
    ['a PDF', '%PDF-1.7', 'a PDF'],
    ['bytes that are no letters', new Uint8Array([1, 0, 2]), 'not a table of text'],
    ['nothing', '', 'empty'],
    ['50 MB', new Uint8Array(50_000_000), 'The file is 50 MB'],
  ])('refuses %s', async (_what, content, words) => {
    expect(await sentenceOf(new Blob([content]))).toContain(words);
  });
});
