import { parseDecimal } from '#shared/lib/decimal.ts';
import { ok, refuse, type Result } from '#shared/lib/result.ts';
import { toGrams, type Grams, type MassUnit } from '#shared/lib/units.ts';

/** A unit a balance may be set to. */
export type BalanceUnit = MassUnit | 'kg';

/** What one line of a balance says. */
export interface BalanceReading {
  /** Rounded to the milligram; below nought while the balance reads so. */
  readonly massG: Grams;
  readonly unit: BalanceUnit;
  /** False while the pan has not come to rest. */
  readonly isStable: boolean;
}

/** How balances write their units; `oz` and `lb` are not here, because they may be troy or not. */
const units: Readonly<Record<string, BalanceUnit>> = {
  g: 'g',
  kg: 'kg',
  dwt: 'dwt',
  pwt: 'dwt',
  ozt: 'ozt',
  'oz t': 'ozt',
  toz: 'ozt',
};

/** Marks before or after the figure; letters as balances print them (common practice, no source), in capitals. */
const marks = {
  stable: ['=', 'ST', 'S'],
  moving: ['~', '?', 'US', 'SD', 'D'],
  /** Gross and net say nothing about the pan: what is tared is the balance's own affair. */
  neutral: ['GS', 'NT', 'G', 'N', 'GROSS', 'NET', 'WT'],
  tare: ['T', 'TR', 'PT', 'TARE'],
  overload: ['OL', 'UL', 'ERR', 'E', 'H', 'L'],
} as const;

type Mark = keyof typeof marks;

const kindOfMark = (token: string): Mark | null => {
  const found = Object.entries(marks).find(([, tokens]) =>
    (tokens as readonly string[]).includes(token.toUpperCase()),
  );
  return found ? (found[0] as Mark) : null;
};

const parts = /^([^\d+-]*)([+-]?)\s*(\d+(?:[.,]\d+)?)\s*([a-z]+(?: t(?![a-z]))?)?\s*([^\d]*)$/i;

const tokensOf = (text: string): readonly string[] => text.split(/[\s,:]+/).filter((token) => token !== '');

const notALine = refuse('That is not a line of a balance. Weigh again, or type the mass.');

const markRefusals: Readonly<Partial<Record<Mark, string>>> = {
  tare: 'That is the tare, not what lies on the pan. Weigh again.',
  overload: 'The balance is over or under its range. Take the pan off, set it to zero and weigh again.',
};

/** A figure after its marks: what it is in, and whether a word behind it is a mark after all. */
const unitOf = (word: string | undefined): { readonly unit: BalanceUnit | null; readonly mark: string } => {
  if (word === undefined) return { unit: null, mark: '' };
  const unit = units[word.toLowerCase()];
  if (unit) return { unit, mark: '' };
  return { unit: null, mark: word };
};

/**
 * Reads one line of a balance: marks, sign, figure, unit, marks, such as `= 12.345 g`, `ST,GS,+0012.34 g` or
 * `12.34 g ?`. A line without a mark is taken as at rest. A figure without a unit is in `bareUnit`, or refused where none
 * is given. Never throws; a refusal is one sentence.
 */
export const readBalanceLine = (line: string, bareUnit?: MassUnit): Result<BalanceReading> => {
  const text = line.trim();
  if (tokensOf(text).some((token) => kindOfMark(token) === 'overload')) {
    return refuse(markRefusals.overload ?? '');
  }
  const match = parts.exec(text);
  if (!match) return notALine;
  const [, before = '', sign = '', figure = '', word, after = ''] = match;
  const { unit = null, mark } = unitOf(word);
  const found = tokensOf(`${before} ${mark} ${after}`);
  const kinds = found.map(kindOfMark);
  const refused = kinds.flatMap((kind) => (kind && markRefusals[kind]) ?? []).at(0);
  if (refused !== undefined) return refuse(refused);
  if (kinds.includes(null)) {
    return /^[a-z]+$/i.test(mark) && kindOfMark(mark) === null
      ? refuse(`The unit “${mark}” is not one we read. Set the balance to g, kg, dwt or ozt.`)
      : notALine;
  }
  const inUnit = unit ?? bareUnit;
  if (!inUnit) return refuse('The line names no unit. Set the balance to send it, in g, kg, dwt or ozt.');
  const typed = parseDecimal(figure);
  if (!typed.ok) return notALine;
  const grams = inUnit === 'kg' ? typed.value * 1000 : toGrams(typed.value, inUnit);
  if (!Number.isFinite(grams)) return notALine;
  const massG = Math.round((sign === '-' ? -grams : grams) * 1000) / 1000;
  return ok({ massG, unit: inUnit, isStable: !kinds.includes('moving') });
};
