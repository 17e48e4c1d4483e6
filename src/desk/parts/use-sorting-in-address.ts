import type { SortingState } from '@tanstack/react-table';
import { useSearchParams } from 'react-router-dom';

const parse = (text: string | null): SortingState => {
  const match = /^(\w+)-(up|down)$/.exec(text ?? '');
  return match ? [{ id: match[1] as string, desc: match[2] === 'down' }] : [];
};

/** A table's order, kept in the address as `?sort=<column>-up` or `-down` so that it can be sent on and gone back to. */
export const useSortingInAddress = (): readonly [SortingState, (sorting: SortingState) => void] => {
  const [search, setSearch] = useSearchParams();
  const change = ([first]: SortingState): void =>
    setSearch(
      (before) => {
        const next = new URLSearchParams(before);
        if (first) next.set('sort', `${first.id}-${first.desc ? 'down' : 'up'}`);
        else next.delete('sort');
        return next;
      },
      { replace: true },
    );
  return [parse(search.get('sort')), change];
};
