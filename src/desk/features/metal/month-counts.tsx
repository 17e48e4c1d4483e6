import { Link } from 'react-router-dom';
import type { Reconciliation } from '#shared/contracts/reconciliation.ts';
import { Panel } from '#src/desk/parts/panel.tsx';
import { PlainTable } from '#src/desk/parts/plain-table.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { writeExactMass } from './metal-mass.ts';

type CountsProps = Pick<Reconciliation, 'counts' | 'uncounted'>;

const linkClass = 'font-extrabold underline decoration-2 underline-offset-4';

const Counted = ({ counts }: Pick<CountsProps, 'counts'>) => {
  const { units, clock } = useStudio();
  return (
    <PlainTable
      caption="Lots that were counted"
      align="left"
      figures={[1, 2, 3]}
      heads={['Lot', `Ledger, ${units.mass}`, `Counted, ${units.mass}`, 'Difference', 'Why', 'Who']}
      rows={counts.map(({ id, code, name, expectedMg, countedMg, explanation, person, at }) => ({
        key: `${code}-${at}`,
        cells: [
          <Link to={`/metal/lots/${id}`} className={linkClass}>
            {code} {name}
          </Link>,
          writeExactMass(expectedMg, units.mass),
          writeExactMass(countedMg, units.mass),
          countedMg === expectedMg ? 'none' : writeExactMass(countedMg - expectedMg, units.mass),
          explanation,
          `${person}, ${clock.dayAndTime(at)}`,
        ],
      }))}
    />
  );
};

const Uncounted = ({ uncounted }: Pick<CountsProps, 'uncounted'>) => {
  const { units } = useStudio();
  return (
    <PlainTable
      caption="Lots still to be counted"
      align="left"
      figures={[1]}
      heads={['Still to be counted', `Ledger, ${units.mass}`, 'On the balance']}
      rows={uncounted.map(({ id, code, name, expectedMg }) => ({
        key: id,
        cells: [
          `${code} ${name}`,
          writeExactMass(expectedMg, units.mass),
          <Link to={`/metal/lots/${id}?act=count`} className={linkClass}>
            Count it<span className="sr-only">: {code}</span>
          </Link>,
        ],
      }))}
    />
  );
};

/** What was counted on the balance in a month, each difference explained, and what is still to be counted. */
export const MonthCounts = ({ counts, uncounted }: CountsProps) => {
  const off = counts.filter(({ countedMg, expectedMg }) => countedMg !== expectedMg).length;
  const differences = off === 0 ? 'none differed' : off === 1 ? '1 differed' : `${off} differed`;
  return (
    <Panel title="Counted on the balance">
      <p className="text-soft">
        {counts.length === 0
          ? 'No lot was counted in this month.'
          : `${counts.length === 1 ? '1 count' : `${counts.length} counts`}, ${differences}.`}
      </p>
      {counts.length > 0 ? <Counted counts={counts} /> : null}
      {uncounted.length > 0 ? <Uncounted uncounted={uncounted} /> : null}
    </Panel>
  );
};
