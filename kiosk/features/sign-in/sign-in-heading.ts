import { firstName } from '#kiosk/lib/presence.ts';

/** The one sentence of the sign-in: who types a PIN, and which flask waits meanwhile. */
export const signInHeading = (
  chosen: { readonly name: string } | null,
  waitingFor: string | null,
): string => {
  const to = waitingFor === null ? '' : ` to go on with ${waitingFor}`;
  return chosen ? `${firstName(chosen.name)}, type your PIN${to}.` : `Who is here? Sign in${to}.`;
};
