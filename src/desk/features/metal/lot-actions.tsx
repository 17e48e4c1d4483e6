import { Link, useSearchParams } from 'react-router-dom';
import type { LotDetail } from '#shared/contracts/lot.ts';
import { buttonClass } from '#src/ui/button-class.ts';
import { Button } from '#src/ui/button.tsx';
import { Icon } from '#src/ui/icon.tsx';
import { lotActs } from './lot-acts.tsx';

type Act = keyof typeof lotActs;

const offered = ({ abilities, quarantineReason }: LotDetail): readonly (readonly [Act, string])[] => {
  const all: readonly (readonly [Act, string, boolean])[] = [
    ['count', 'Count it', abilities.count],
    ['assay', 'New assay', abilities.amend],
    ['move', 'Put it elsewhere', abilities.amend],
    ['quarantine', 'Quarantine', abilities.amend && quarantineReason === null],
    ['release', 'Let it out of quarantine', abilities.release],
    ['dispatch', 'Send to refine', abilities.dispatch],
  ];
  return all.flatMap(([act, words, isOffered]) => (isOffered ? [[act, words] as const] : []));
};

/** What this person may do with a lot, each in a dialog of its own that the address can name, and its label. */
export const LotActions = ({ lot }: { readonly lot: LotDetail }) => {
  const [search, setSearch] = useSearchParams();
  const acts = offered(lot);
  const open = acts.find(([act]) => act === search.get('act'))?.[0];
  const Open = open === undefined ? null : lotActs[open];
  const close = (): void => setSearch({}, { replace: true });
  return (
    <div className="screen-only flex flex-wrap gap-3 pb-9">
      {acts.map(([act, words]) => (
        <Button key={act} onClick={() => setSearch({ act }, { replace: true })}>
          {words}
        </Button>
      ))}
      <Link to={`/print/lots/${lot.id}`} className={buttonClass()}>
        <Icon name="print" />
        Label
      </Link>
      {Open ? <Open lot={lot} onClose={close} /> : null}
    </div>
  );
};
