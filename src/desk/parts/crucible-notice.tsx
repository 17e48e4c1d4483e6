import { useQuery } from '@tanstack/react-query';
import { Link } from 'react-router-dom';
import type { FilledCrucible } from '#shared/contracts/charge.ts';
import { cruciblesQuery } from '#src/api/charges.ts';
import { buttonClass } from '#src/ui/button-class.ts';
import { Notice } from '#src/ui/notice.tsx';
import { useDeskSession } from './desk-session.ts';
import { useStudio } from './use-studio.ts';

const Left = ({ crucible }: { readonly crucible: FilledCrucible }) => {
  const { mass, clock } = useStudio();
  const { melt, alloy, massG, endedAt, person } = crucible;
  return (
    <Notice
      kind="caution"
      title={`${mass(massG)} of ${alloy.name} are still in the crucible of ${melt.code}.`}
      action={
        <Link to={`/metal/crucibles/${melt.id}`} className={buttonClass()}>
          Say what became of it
        </Link>
      }
    >
      Its card, opened by {person}, ended {endedAt === null ? '' : clock.dayAndTime(endedAt)} with metal in
      it. Until it is closed out, that metal is neither on hand nor in castings.
    </Notice>
  );
};

/** Metal left in crucibles whose cards have ended: of one melt, or of every melt; nothing for those who keep no metal. */
export const CrucibleNotice = ({ meltId }: { readonly meltId?: string }) => {
  const { person } = useDeskSession();
  const keepsMetal = person.roles.includes('owner') || person.roles.includes('caster');
  const { data = [] } = useQuery({ ...cruciblesQuery, enabled: keepsMetal });
  const left = data.filter(
    ({ endedAt, melt }) => endedAt !== null && (meltId === undefined || melt.id === meltId),
  );
  if (left.length === 0) return null;
  return (
    <div className="screen-only grid gap-3 pb-8">
      {left.map((crucible) => (
        <Left key={crucible.melt.id} crucible={crucible} />
      ))}
    </div>
  );
};
