/** Keys of a number pad; `erase` takes the last character away, `clear` all of them. */
export type PadKey = '0' | '1' | '2' | '3' | '4' | '5' | '6' | '7' | '8' | '9' | '.' | 'erase' | 'clear';

/** What a pad takes: whole numbers only or one decimal point, and how many characters. */
export interface PadLimits {
  readonly decimals: boolean;
  readonly maxLength: number;
}

/** The text after one more key; a second decimal point and a character too many are ignored, zeros are kept. */
export const pressKey = (text: string, key: PadKey, { decimals, maxLength }: PadLimits): string => {
  if (key === 'clear') return '';
  if (key === 'erase') return text.slice(0, -1);
  if (key === '.' && (!decimals || text.includes('.'))) return text;
  const typed = key === '.' && text === '' ? '0.' : text + key;
  return typed.length > maxLength ? text : typed;
};

/** The pad key meant by a key of a keyboard, a comma being a decimal point; null when the pad has no such key. */
export const padKeyOf = (key: string): PadKey | null => {
  if (/^[0-9.]$/.test(key)) return key as PadKey;
  if (key === ',') return '.';
  if (key === 'Backspace') return 'erase';
  return key === 'Delete' ? 'clear' : null;
};
