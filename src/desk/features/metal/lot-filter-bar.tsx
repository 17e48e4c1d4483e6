import { useSearchParams } from 'react-router-dom';
import { lotKindNames, lotKinds } from '#shared/domain/metal/lot.ts';
import { SelectField } from '#src/ui/select-field.tsx';
import { capitalised } from '#src/desk/parts/element-names.ts';
import type { LotFilters } from './lot-filters.ts';

const kinds = lotKinds.map((kind) => ({ value: kind, label: capitalised(lotKindNames[kind]) }));
const metals = [
  { value: 'Au', label: 'Holding gold' },
  { value: 'Ag', label: 'Holding silver' },
  { value: 'other', label: 'Neither gold nor silver' },
];
const presence = [{ value: 'used-up', label: 'Used up' }];

/** Chooses which lots are listed; the choice stands in the address. */
export const LotFilterBar = ({ filters }: { readonly filters: LotFilters }) => {
  const [, setSearch] = useSearchParams();
  const set = (name: string, value: string): void =>
    setSearch(
      (before) => {
        const next = new URLSearchParams(before);
        if (value === '') next.delete(name);
        else next.set(name, value);
        return next;
      },
      { replace: true },
    );
  return (
    <div role="search" aria-label="Which lots" className="grid max-w-3xl gap-4 pb-7 sm:grid-cols-3">
      <SelectField
        label="Kind"
        placeholder="Every kind"
        options={kinds}
        value={filters.kind ?? ''}
        onChange={({ target }) => set('kind', target.value)}
      />
      <SelectField
        label="Metal"
        placeholder="Every metal"
        options={metals}
        value={filters.metal ?? ''}
        onChange={({ target }) => set('metal', target.value)}
      />
      <SelectField
        label="Lots"
        placeholder="On hand"
        options={presence}
        value={filters.onHand === 'no' ? 'used-up' : ''}
        onChange={({ target }) => set('lots', target.value)}
      />
    </div>
  );
};
