import { Icon } from '#src/ui/icon.tsx';
import { useOutboxView } from './outbox-context.ts';
import type { OutboxView } from './outbox.ts';

const records = (count: number): string => (count === 1 ? '1 record waits' : `${count} records wait`);

/** What the badge says; empty when everything is delivered or on its way. */
export const waitingWords = ({ entries, status, isKept }: OutboxView): string => {
  if (entries.length === 0) return '';
  const waiting = records(entries.length);
  if (!isKept) return `${waiting}. Do not switch off.`;
  if (status === 'unreachable') return `No server. ${waiting}.`;
  return status === 'sign-in' ? `${waiting} for a sign-in.` : `${waiting}.`;
};

/** Says how many records have not reached the server yet; nothing lost, they go by themselves. */
export const WaitingBadge = () => {
  const words = waitingWords(useOutboxView());
  return (
    <span
      role="status"
      className={words ? 'inline-flex items-center gap-2 text-xl font-extrabold text-ink' : 'sr-only'}
    >
      {words ? <Icon name="no-network" /> : null}
      {words}
    </span>
  );
};
