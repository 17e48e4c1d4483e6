import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { splitLines } from './split-lines.ts';

const linesOf = (...pieces: readonly string[]): readonly string[] => {
  const lines: string[] = [];
  const push = splitLines((line) => lines.push(line));
  for (const piece of pieces) push(piece);
  return lines;
};

describe('splitLines', () => {
  it('ends a line at CR, LF or both, however the pieces fall', () => {
    expect(linesOf('  12.3', '45 g\r', '\n  12.346 g\n7 g')).toEqual(['  12.345 g', '  12.346 g']);
    fc.assert(
      fc.property(fc.array(fc.stringMatching(/^[ -~]{1,40}$/)), fc.nat(), (texts, seed) => {
        const stream = texts.map((text) => `${text}\r\n`).join('');
        const cut = stream.length === 0 ? 0 : seed % stream.length;
        expect(linesOf(stream.slice(0, cut), stream.slice(cut))).toEqual(
          texts.filter((text) => text.trim() !== ''),
        );
      }),
    );
  });

  it('drops what does not end, and hears the line after it', () => {
    expect(linesOf('x'.repeat(500), 'x\n', '1 g\n')).toEqual(['1 g']);
  });
});
