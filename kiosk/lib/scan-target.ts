import { parseFlaskCode } from '#shared/lib/codes.ts';

/** The terminal's address that looks a code up. */
export const addressOfCode = (code: string): string => `/scan?code=${encodeURIComponent(code)}`;

/** Whether text typed by a scanner can be a code of any kind rather than digits meant for a pad. */
export const looksScanned = (text: string): boolean => /\D/.test(text.trim());

/** What is wrong with a code before the server is asked, in one sentence; null when it is a flask's. */
export const refusalOfCode = (code: string): string | null => {
  const parsed = parseFlaskCode(code);
  return parsed.ok ? null : parsed.error;
};
