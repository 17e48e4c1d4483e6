import type { Terminal as TerminalContract } from '#shared/contracts/terminal.ts';
import type { Terminal } from '../models/terminal.ts';
import type { Actor } from '../policies/actor.ts';
import { can } from '../policies/policy.ts';
import { terminalPolicy } from '../policies/terminal.ts';

/** A terminal as the owner sees it. */
export const presentTerminal = (terminal: Terminal, actor: Actor): TerminalContract => ({
  id: terminal.id,
  name: terminal.name,
  bay: terminal.bay,
  enrolledAt: terminal.enrolledAt.toISOString(),
  lastSeenAt: terminal.lastSeenAt?.toISOString() ?? null,
  revokedAt: terminal.revokedAt?.toISOString() ?? null,
  abilities: { revoke: terminal.revokedAt === null && can(terminalPolicy.revoke, actor, undefined) },
});
