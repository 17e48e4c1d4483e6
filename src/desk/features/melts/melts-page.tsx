import { useInfiniteQuery } from '@tanstack/react-query';
import { meltsQuery } from '#src/api/melts.ts';
import { Button } from '#src/ui/button.tsx';
import { DataTable } from '#src/ui/data-table.tsx';
import { Notice } from '#src/ui/notice.tsx';
import { PageTitle } from '#src/ui/page-title.tsx';
import { Loaded } from '../../parts/loaded.tsx';
import { useSortingInAddress } from '../../parts/use-sorting-in-address.ts';
import { useStudio } from '../../parts/use-studio.ts';
import { meltColumns } from './melt-columns.tsx';

const noMelt = (
  <Notice kind="empty" title="The melt book is still empty.">
    The first card that is opened at a terminal writes its first line.
  </Notice>
);

/** Every melt, newest first; older ones are read page by page. */
export const MeltsPage = () => {
  const writing = useStudio();
  const book = useInfiniteQuery({ ...meltsQuery, refetchInterval: 10_000 });
  const [sorting, setSorting] = useSortingInAddress();
  return (
    <>
      <PageTitle
        title="Melt book"
        summary="Every melt as it happened. Entries are added and amended, never changed or removed."
      />
      <Loaded query={book} what="the melt book">
        {({ pages }) => {
          const melts = pages.flatMap((page) => page.melts);
          return (
            <>
              <div className="overflow-x-auto">
                <DataTable
                  caption="Melts, newest first"
                  hideCaption
                  columns={meltColumns(writing)}
                  rows={melts}
                  rowKey={({ id }) => id}
                  rowHref={({ id }) => `/melts/${id}`}
                  sorting={sorting}
                  onSortingChange={setSorting}
                  empty={noMelt}
                />
              </div>
              {book.hasNextPage ? (
                <p className="pt-6">
                  <Button busy={book.isFetchingNextPage} onClick={() => void book.fetchNextPage()}>
                    Show older melts
                  </Button>
                </p>
              ) : melts.length > 0 ? (
                <p className="pt-5 text-soft">That is the whole book, back to its first melt.</p>
              ) : null}
            </>
          );
        }}
      </Loaded>
    </>
  );
};
