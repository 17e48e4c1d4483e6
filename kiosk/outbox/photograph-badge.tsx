import { Icon } from '#src/ui/icon.tsx';
import { usePhotographBox, usePhotographView } from './photograph-context.ts';
import type { PhotographView } from './photograph-box.ts';

/** How many photographs wait, in a few words; empty when all are delivered. */
export const photographWords = ({ waiting, isKept }: PhotographView): string => {
  const count = waiting.filter(({ refusal }) => refusal === undefined).length;
  if (count === 0) return '';
  const words = count === 1 ? '1 photograph waits.' : `${count} photographs wait.`;
  return isKept ? words : `${words} Do not switch off.`;
};

/** Says which photographs have not reached the server, and which it would not take, until that has been read. */
export const PhotographBadge = () => {
  const box = usePhotographBox();
  const view = usePhotographView();
  const words = photographWords(view);
  const refused = view.waiting.find(({ refusal }) => refusal !== undefined);
  return (
    <>
      <span
        role="status"
        className={words ? 'inline-flex items-center gap-2 text-xl font-extrabold text-ink' : 'sr-only'}
      >
        {words ? <Icon name="camera" /> : null}
        {words}
      </span>
      {refused ? (
        <button
          type="button"
          className="min-h-18 rounded-2xl px-3 text-xl font-extrabold text-ink underline"
          onClick={() => void box.dismiss(refused.id)}
        >
          A photograph was not taken: {refused.refusal} Touch when you have read this.
        </button>
      ) : null}
    </>
  );
};
