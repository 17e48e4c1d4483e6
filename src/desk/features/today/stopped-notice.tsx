import { Link } from 'react-router-dom';
import type { MeltSummary } from '#shared/contracts/melt.ts';
import { splitCode } from '#shared/lib/codes.ts';
import { buttonClass } from '#src/ui/button-class.ts';
import { Notice } from '#src/ui/notice.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';

/** Says that work is stopped on a card: why, who, where and since when; it stays until someone resumes or ends the card. */
export const StoppedNotice = ({ melts }: { readonly melts: readonly MeltSummary[] }) => {
  const { clock } = useStudio();
  return (
    <div className="grid gap-4 pb-6 empty:hidden">
      {melts.map(({ id, code, stop, flaskCode, person, terminal }) =>
        stop ? (
          <Notice
            key={id}
            kind="error"
            title={`${stop.sentence} ${person} at ${terminal}, ${clock.time(stop.at)}.`}
            action={
              <Link to={`/melts/${id}`} className={buttonClass()}>
                Open melt {splitCode(code).main}
              </Link>
            }
          >
            Flask {splitCode(flaskCode).main}. The card waits until someone resumes or ends it at the
            terminal.
          </Notice>
        ) : null,
      )}
    </div>
  );
};
