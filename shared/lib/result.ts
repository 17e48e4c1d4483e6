/** The outcome of something that may be refused: a value, or an error with its reason. */
export type Result<Value, Problem = string> =
  { readonly ok: true; readonly value: Value } | { readonly ok: false; readonly error: Problem };

/** Wraps a value as a success. */
export const ok = <Value>(value: Value): { readonly ok: true; readonly value: Value } => ({
  ok: true,
  value,
});

/** Wraps a reason as a refusal. */
export const refuse = <Problem>(error: Problem): { readonly ok: false; readonly error: Problem } => ({
  ok: false,
  error,
});
