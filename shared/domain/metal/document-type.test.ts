import { describe, expect, it } from 'vitest';
import { typeOfContent } from './document-type.ts';

const bytes = (text: string, ...first: number[]): Uint8Array =>
  new Uint8Array([...first, ...[...text].map((letter) => letter.charCodeAt(0))]);

describe('what a file is', () => {
  it.each([
    ['application/pdf', bytes('%PDF-1.7')],
    ['image/jpeg', bytes('JFIF', 0xff, 0xd8, 0xff, 0xe0)],
    ['image/png', bytes('', 0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a)],
    ['image/webp', bytes('RIFF\0\0\0\0WEBPVP8 ')],
    [null, bytes('<html>')],
    [null, bytes('MZ')],
    [null, bytes('RIFF\0\0\0\0WAVE')],
    [null, bytes('')],
    [null, bytes(' %PDF-1.7')],
  ])('is told by its first bytes: %s', (type, content) => {
    expect(typeOfContent(content)).toBe(type);
  });
});
