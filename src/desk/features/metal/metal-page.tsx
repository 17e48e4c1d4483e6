import { useQuery } from '@tanstack/react-query';
import { Link, useSearchParams } from 'react-router-dom';
import type { Lot } from '#shared/contracts/lot.ts';
import { lotsQuery } from '#src/api/lots.ts';
import { buttonClass } from '#src/ui/button-class.ts';
import { Icon } from '#src/ui/icon.tsx';
import { Notice } from '#src/ui/notice.tsx';
import { PageTitle } from '#src/ui/page-title.tsx';
import { CrucibleNotice } from '#src/desk/parts/crucible-notice.tsx';
import { Loaded } from '#src/desk/parts/loaded.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { LotFilterBar } from './lot-filter-bar.tsx';
import { chooseLots, filtersOf, type LotFilters } from './lot-filters.ts';
import { LotTable } from './lot-table.tsx';
import { totalsSentence } from './lot-words.ts';

const ReceiveLink = () => (
  <Link to="/metal/receive" className={buttonClass({ kind: 'main' })}>
    <Icon name="plus" />
    Receive a lot
  </Link>
);

const Actions = () => (
  <>
    <Link to="/metal/intake" className={buttonClass()}>
      Take in a sheet
    </Link>
    <ReceiveLink />
  </>
);

const Nothing = ({ isFiltered, onHand }: { readonly isFiltered: boolean } & Pick<LotFilters, 'onHand'>) => {
  if (isFiltered) return <Notice kind="empty" title="No lot is like that. Choose another kind or metal." />;
  if (onHand === 'no') return <Notice kind="empty" title="No lot is used up yet." />;
  return (
    <Notice kind="empty" title="No metal is on hand yet." action={<ReceiveLink />}>
      Receive the first lot with what its certificate says; charges are planned from what lies here.
    </Notice>
  );
};

const Lots = ({ lots, filters }: { readonly lots: readonly Lot[]; readonly filters: LotFilters }) => {
  const { mass } = useStudio();
  const isFiltered = filters.kind !== null || filters.metal !== null;
  const chosen = chooseLots(lots, filters);
  return (
    <>
      {filters.onHand === 'yes' && chosen.length > 0 ? (
        <p className="pb-7 text-[24px] leading-snug font-extrabold text-pretty">
          {totalsSentence(chosen, mass)}
        </p>
      ) : null}
      <LotFilterBar filters={filters} />
      <LotTable lots={chosen} empty={<Nothing isFiltered={isFiltered} onHand={filters.onHand} />} />
    </>
  );
};

/** The lots of metal on hand, what they come to, what cards have left in crucibles, and the ways to more metal. */
export const MetalPage = () => {
  const [search] = useSearchParams();
  const filters = filtersOf(search);
  const lots = useQuery(lotsQuery(filters.onHand));
  return (
    <>
      <PageTitle
        title="Metal"
        summary="Every lot with what its certificate says and what is left of it."
        actions={<Actions />}
      />
      <CrucibleNotice />
      <Loaded query={lots} what="the lots">
        {(list) => <Lots lots={list} filters={filters} />}
      </Loaded>
    </>
  );
};
