import { checkDigit } from './check-digit.ts';
import { ok, refuse, type Result } from './result.ts';

/** What a printed code may name: a flask, a tree, a melt or a lot of metal. */
export type CodeKind = 'F' | 'T' | 'M' | 'L';

declare const flaskCode: unique symbol;
/** The code engraved on a flask, such as `F-0147-8`: kind, number, check digit. */
export type FlaskCode = string & { readonly [flaskCode]: true };

const kindNames: Readonly<Record<CodeKind, string>> = { F: 'flask', T: 'tree', M: 'melt', L: 'lot' };

/** The kind's letter as two digits (A is 10), so that the check digit covers it too. */
const kindDigits = (kind: CodeKind): string => String(kind.charCodeAt(0) - 55);

/** Builds a code from its kind and number, with its check digit: `('F', 147)` gives `F-0147-8`. */
export const buildCode = (kind: CodeKind, number: number): string => {
  const padded = String(number).padStart(4, '0');
  return `${kind}-${padded}-${checkDigit(kindDigits(kind) + padded)}`;
};

/** Builds a flask's code from its number, 1 to 999999. */
export const buildFlaskCode = (number: number): FlaskCode => buildCode('F', number) as FlaskCode;

/** The number within a code: 147 for `F-0147-8`. */
export const numberOfCode = (code: string): number => Number(code.split('-')[1]);

/** Splits a code for display: `F-0147` large, its check digit small. */
export const splitCode = (code: string): { readonly main: string; readonly check: string } => ({
  main: code.slice(0, -2),
  check: code.slice(-1),
});

const shape = /^([A-Z])?[\s-]*(\d{4,6})[\s-]*(\d)$/;

/** How people are told of each kind of code that is read: what to scan, and where its number stands. */
const places: Readonly<Record<'F' | 'L', { readonly scan: string; readonly on: string }>> = {
  F: { scan: 'the code on the flask or its traveller card', on: 'the flask' },
  L: { scan: 'the label of the lot', on: 'the label' },
};

const parseCode = (kind: 'F' | 'L', text: string): Result<string> => {
  const [name, { scan, on }] = [kindNames[kind], places[kind]];
  const cleaned = text.trim().toUpperCase();
  if (cleaned === '') return refuse(`Nothing was read. Scan the code on ${on}, or type its number.`);
  const match = shape.exec(cleaned);
  if (!match) {
    return /^\d{1,4}$/.test(cleaned)
      ? refuse(`That number is too short. Type all digits on ${on}, the small last one too.`)
      : refuse(`That is not one of our ${name} codes. Scan ${scan}.`);
  }
  const [, letter = kind, digits = '', check] = match;
  if (letter !== kind)
    return refuse(`That code names a ${kindNames[letter as CodeKind] ?? 'different thing'}, not a ${name}.`);
  if (checkDigit(kindDigits(kind) + digits) !== check) {
    return refuse(`One digit is wrong or missing. Scan again, or check the number on ${on}.`);
  }
  return ok(`${kind}-${digits}-${check}`);
};

/** Reads a scanned or typed flask code; a refusal is one sentence that says what is wrong and what to do. */
export const parseFlaskCode = (text: string): Result<FlaskCode> => parseCode('F', text) as Result<FlaskCode>;

/** Reads a scanned or typed lot code, such as `L-0001-2`; a refusal is one sentence that says what is wrong and what to do. */
export const parseLotCode = (text: string): Result<string> => parseCode('L', text);
