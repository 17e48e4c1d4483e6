import { Link } from 'react-router-dom';
import type { LotAmendment, LotDetail } from '#shared/contracts/lot.ts';
import type { AmendmentKind } from '#shared/domain/metal/lot.ts';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { writeComposition } from '#src/desk/parts/element-names.ts';

const kindWords: Readonly<Record<AmendmentKind, string>> = {
  assay: 'New assay',
  quarantined: 'Put in quarantine',
  released: 'Let out of quarantine',
  moved: 'Put elsewhere',
};

const detailOf = ({ compositionWt, toleranceWt, place }: LotAmendment): string =>
  compositionWt ? writeComposition(compositionWt, toleranceWt ?? {}) : (place ?? '');

const linkClass = 'font-extrabold underline decoration-2 underline-offset-4';

/** The melts that hold metal of a lot whose assay changed, and the lots their buttons became. */
const Touched = ({ lot: { melts, becameLots } }: { readonly lot: LotDetail }) => {
  if (melts.length === 0) return <span>It touches no melt: none of the lot had been weighed in.</span>;
  const places = [
    ...melts.map(({ id, code }) => ({ code, to: `/melts/${id}` })),
    ...becameLots.map(({ id, code }) => ({ code, to: `/metal/lots/${id}` })),
  ];
  return (
    <span className="flex flex-wrap gap-x-3">
      It touches
      {places.map(({ code, to }) => (
        <Link key={code} to={to} className={linkClass}>
          {code}
        </Link>
      ))}
    </span>
  );
};

/** What was found out or decided about a lot since it came, oldest first. */
export const LotAmendments = ({ lot }: { readonly lot: LotDetail }) => {
  const { clock } = useStudio();
  if (lot.amendments.length === 0) return <p className="text-soft">Nothing was changed since it came.</p>;
  return (
    <ul className="grid">
      {lot.amendments.map((amendment) => {
        const detail = detailOf(amendment);
        return (
          <li key={`${amendment.at}-${amendment.kind}`} className="grid gap-0.5 border-t-2 border-line py-2">
            <span className="font-extrabold">
              {kindWords[amendment.kind]}
              {detail ? `: ${detail}` : ''}
            </span>
            {amendment.reason ? <span>{amendment.reason}</span> : null}
            {amendment.kind === 'assay' ? <Touched lot={lot} /> : null}
            <span className="text-[15px] text-soft">
              {amendment.person}, {clock.dayAndTime(amendment.at)}
            </span>
          </li>
        );
      })}
    </ul>
  );
};

/** The melts a lot's metal went into, and the lots their buttons became. */
export const LotPath = ({ lot }: { readonly lot: LotDetail }) => {
  const { mass } = useStudio();
  if (lot.melts.length === 0) return <p className="text-soft">None of it has been weighed into a melt.</p>;
  return (
    <ul className="grid">
      {lot.melts.map(({ id, code, massG }) => (
        <li key={id} className="flex justify-between gap-4 border-t-2 border-line py-2">
          <Link to={`/melts/${id}`} className="font-extrabold underline decoration-2 underline-offset-4">
            {code}
          </Link>
          <span>{mass(massG)} in</span>
        </li>
      ))}
      {lot.becameLots.map(({ id, code, name }) => (
        <li key={id} className="flex justify-between gap-4 border-t-2 border-line py-2">
          <Link to={`/metal/lots/${id}`} className="font-extrabold underline decoration-2 underline-offset-4">
            {code}
          </Link>
          <span>{name}</span>
        </li>
      ))}
    </ul>
  );
};
