import { longestSheet } from '#shared/contracts/lot-intake.ts';
import { ok, refuse, type Result } from '#shared/lib/result.ts';

/** A sheet as text, and how its letters were read where that was a guess. */
export interface SheetText {
  readonly text: string;
  readonly remark: string;
}

/** Bytes of the largest file that could still hold the longest sheet, two to each letter. */
const largestBytes = longestSheet * 2 + 2;

const signatures: readonly (readonly [bytes: string, sentence: string])[] = [
  ['PK', 'That is a workbook, not a table of text. Save its sheet as CSV and choose that.'],
  ['%PDF', 'That is a PDF, not a table of text. Ask for the list as CSV.'],
];

const startsWith = (bytes: Uint8Array, letters: string): boolean =>
  [...letters].every((letter, index) => bytes[index] === letter.charCodeAt(0));

const decode = (bytes: Uint8Array): Result<SheetText> => {
  if (bytes[0] === 0xff && bytes[1] === 0xfe)
    return ok({ text: new TextDecoder('utf-16le').decode(bytes), remark: '' });
  if (bytes.includes(0)) return refuse('That is not a table of text. Save the sheet as CSV and choose that.');
  try {
    return ok({ text: new TextDecoder('utf-8', { fatal: true }).decode(bytes), remark: '' });
  } catch {
    const remark = 'Its letters were read as Western European (Windows-1252): look whether they are right.';
    return ok({ text: new TextDecoder('windows-1252').decode(bytes), remark });
  }
};

/** Reads a chosen file as a sheet of text; a sentence where it is none, before anything is sent. */
export const readSheetFile = async (file: Blob): Promise<Result<SheetText>> => {
  if (file.size === 0) return refuse('The file is empty.');
  if (file.size > largestBytes)
    return refuse(
      `The file is ${Math.ceil(file.size / 100_000) / 10} MB: a sheet of some thousand lots is far smaller. Choose another, or divide it.`,
    );
  const bytes = new Uint8Array(await file.arrayBuffer());
  const known = signatures.find(([letters]) => startsWith(bytes, letters));
  if (known) return refuse(known[1]);
  const read = decode(bytes);
  if (read.ok && read.value.text.length > longestSheet)
    return refuse('That is more than a sheet of some thousand lots: divide it.');
  return read;
};
