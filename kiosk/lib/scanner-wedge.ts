/** Keystrokes further apart than this are a person's, not a scanner's, ms. */
const longestGapMs = 120;
/** Fewer characters than this are never a code. */
const shortestCode = 4;
const longestCode = 120;

/** What a scanner that types like a keyboard has sent so far, and when its last key came. */
export interface WedgeBurst {
  readonly text: string;
  readonly lastAtMs: number;
}

/** Nothing typed yet. */
export const noBurst: WedgeBurst = { text: '', lastAtMs: 0 };

/** The burst after one more key at `atMs`, and the code when the key was the Enter that ends it. */
export const pressWedgeKey = (
  burst: WedgeBurst,
  key: string,
  atMs: number,
): { readonly burst: WedgeBurst; readonly code: string | null } => {
  const isFast = atMs - burst.lastAtMs <= longestGapMs;
  const text = isFast ? burst.text : '';
  if (key === 'Enter') return { burst: noBurst, code: text.length >= shortestCode ? text : null };
  // Shift and the like come between a scanner's capitals.
  if (key.length !== 1) return { burst: { ...burst, lastAtMs: isFast ? atMs : burst.lastAtMs }, code: null };
  return { burst: { text: (text + key).slice(-longestCode), lastAtMs: atMs }, code: null };
};
