/** What a lot's document may be, by its media type. */
export const documentTypes = ['application/pdf', 'image/jpeg', 'image/png', 'image/webp'] as const;
/** One kind of document. */
export type DocumentType = (typeof documentTypes)[number];

const ascii = (bytes: Uint8Array, from: number, text: string): boolean =>
  [...text].every((letter, index) => bytes[from + index] === letter.charCodeAt(0));

const starts = (bytes: Uint8Array, ...first: readonly number[]): boolean =>
  first.every((byte, index) => bytes[index] === byte);

/** What a file is by its first bytes, whatever it calls itself; null for anything but our kinds of document. */
export const typeOfContent = (bytes: Uint8Array): DocumentType | null => {
  if (ascii(bytes, 0, '%PDF-')) return 'application/pdf';
  if (starts(bytes, 0xff, 0xd8, 0xff)) return 'image/jpeg';
  if (starts(bytes, 0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a)) return 'image/png';
  if (ascii(bytes, 0, 'RIFF') && ascii(bytes, 8, 'WEBP')) return 'image/webp';
  return null;
};
