import type { Actor } from './actor.ts';

/** Who may do one thing: `who` asks of the person alone, `when` of the person and the record. */
export interface Policy<Subject = undefined> {
  readonly who: (actor: Actor) => boolean;
  /** What is said to those it refuses, where “sign in” or “not allowed” would mislead. */
  readonly refusal?: 'terminal-not-enrolled' | 'token-refused';
  readonly when?: (actor: Actor, subject: Subject) => boolean;
}

/** Whether the actor may do it to this subject. */
export const can = <Subject>(policy: Policy<Subject>, actor: Actor, subject: Subject): boolean =>
  policy.who(actor) && (policy.when?.(actor, subject) ?? true);

/** Anyone at all, signed in or not. */
export const anyone: Policy = { who: () => true };
