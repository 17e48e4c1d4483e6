import type { Refusal, RefusalCode } from './types.ts';

/** Makes a typed refusal. */
export const refuse = (code: RefusalCode, reason: string): Refusal => ({ withinModel: false, code, reason });
