import { useQuery } from '@tanstack/react-query';
import { Link, useParams } from 'react-router-dom';
import type { Melt } from '#shared/contracts/melt.ts';
import { splitCode } from '#shared/lib/codes.ts';
import { meltQuery } from '#src/api/melts.ts';
import { isProblemError } from '#src/lib/http.ts';
import { AlloyChip } from '#src/ui/alloy-chip.tsx';
import { Button } from '#src/ui/button.tsx';
import { buttonClass } from '#src/ui/button-class.ts';
import { Notice } from '#src/ui/notice.tsx';
import { PageTitle } from '#src/ui/page-title.tsx';
import { CrucibleNotice } from '#src/desk/parts/crucible-notice.tsx';
import { Loaded } from '#src/desk/parts/loaded.tsx';
import { metalOf } from '#src/desk/parts/metal-of.ts';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { MeltSections } from './melt-sections.tsx';
import { MeltStateMark } from './melt-state-mark.tsx';

const MeltTitle = ({ melt }: { readonly melt: Melt }) => {
  const { clock } = useStudio();
  const poured = melt.pouredAt
    ? `poured ${clock.dayAndTime(melt.pouredAt)}`
    : `opened ${clock.dayAndTime(melt.openedAt)}`;
  return (
    <PageTitle
      title={`Melt ${splitCode(melt.code).main}`}
      mark={
        <>
          <AlloyChip name={melt.alloyName} fineness={String(melt.fineness)} metal={metalOf(melt.family)} />
          <MeltStateMark melt={melt} />
        </>
      }
      summary={`${melt.code}, flask ${melt.flaskCode}, ${poured} by ${melt.person} at ${melt.terminal}. Tree ${melt.casting.tree.code}: ${melt.casting.tree.description}, ${melt.casting.tree.pieces} pieces.`}
      actions={
        <Button icon="print" onClick={() => window.print()}>
          Print
        </Button>
      }
    />
  );
};

const noSuchMelt = (
  <>
    <PageTitle title="No such melt" />
    <Notice
      kind="empty"
      title="The melt book has no melt at this address."
      action={
        <Link to="/melts" className={buttonClass()}>
          Open the melt book
        </Link>
      }
    />
  </>
);

const isMissing = (error: unknown): boolean =>
  isProblemError(error, 'not-found') || isProblemError(error, 'invalid-request');

/** One melt: what was charged, read, poured and quenched, what departed from the card, and every entry in order. */
export const MeltPage = () => {
  const { meltId = '' } = useParams();
  const query = useQuery(meltQuery(meltId));
  if (isMissing(query.error)) return noSuchMelt;
  return (
    <Loaded query={query} what="the melt">
      {(melt) => (
        <>
          <MeltTitle melt={melt} />
          <CrucibleNotice meltId={melt.id} />
          <MeltSections melt={melt} />
        </>
      )}
    </Loaded>
  );
};
