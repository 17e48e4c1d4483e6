import { useQuery } from '@tanstack/react-query';
import { Link, useSearchParams } from 'react-router-dom';
import type { LossRate, Reconciliation } from '#shared/contracts/reconciliation.ts';
import { reconciliationFile, reconciliationQuery } from '#src/api/reconciliation.ts';
import { useNow } from '#src/lib/use-now.ts';
import { buttonClass } from '#src/ui/button-class.ts';
import { Icon } from '#src/ui/icon.tsx';
import { Notice } from '#src/ui/notice.tsx';
import { PageTitle } from '#src/ui/page-title.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { Loaded } from '#src/desk/parts/loaded.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';
import { Panel } from '#src/desk/parts/panel.tsx';
import { PlainTable } from '#src/desk/parts/plain-table.tsx';
import { writeExactMass } from './metal-mass.ts';
import { MonthCounts } from './month-counts.tsx';
import { MonthAccount } from './month-account.tsx';
import {
  crucibleLines,
  isMonth,
  lossRateWords,
  lotLines,
  missingMg,
  monthAfter,
  monthWords,
} from './month-words.ts';

const Steps = ({ month, current }: { readonly month: string; readonly current: string }) => (
  <>
    <Link
      to={`?month=${monthAfter(month, -1)}`}
      className={buttonClass({}, '!px-3')}
      aria-label={`The month before, ${monthWords(monthAfter(month, -1))}`}
    >
      <Icon name="back" />
    </Link>
    {month < current ? (
      <Link
        to={`?month=${monthAfter(month, 1)}`}
        className={buttonClass({}, '!px-3')}
        aria-label={`The month after, ${monthWords(monthAfter(month, 1))}`}
      >
        <Icon name="forward" />
      </Link>
    ) : null}
    <a href={reconciliationFile(month, 'pdf')} download className={buttonClass()}>
      <Icon name="print" />
      PDF to sign
    </a>
    <a href={reconciliationFile(month, 'csv')} download className={buttonClass()}>
      CSV
    </a>
  </>
);

const AddsUp = ({ total }: Pick<Reconciliation, 'total'>) => {
  const { units } = useStudio();
  const missing = missingMg(lotLines, total) + missingMg(crucibleLines, total);
  return missing === 0 ? (
    <StateMark state="ready" text="Every line adds up to the milligram." />
  ) : (
    <StateMark
      state="stop"
      text={`The lines do not add up: ${writeExactMass(missing, units.mass)} ${units.mass} stand between them.`}
    />
  );
};

const Losses = ({ caption, rates }: { readonly caption: string; readonly rates: readonly LossRate[] }) => {
  const { units } = useStudio();
  return (
    <Panel title={caption}>
      <PlainTable
        caption={`${caption}, in figures`}
        heads={['Name', 'Melts', `Metal in, ${units.mass}`, `Lost, ${units.mass}`, 'Lost']}
        rows={rates.map((rate) => ({
          key: rate.name,
          cells: [
            rate.name,
            rate.melts,
            writeExactMass(rate.metalInMg, units.mass),
            writeExactMass(rate.lostMg, units.mass),
            lossRateWords(rate),
          ],
        }))}
      />
    </Panel>
  );
};

const MonthView = ({ month }: { readonly month: Reconciliation }) => {
  const { metals, total, lossByAlloy, lossByCaster, lossByFurnace, lossByTerminal } = month;
  if (metals.length === 0)
    return (
      <Notice kind="empty" title="No metal was on hand or moved in this month.">
        The account begins with the first lot that is received.
      </Notice>
    );
  return (
    <div className="grid gap-11">
      <AddsUp total={total} />
      <MonthAccount caption="Lots" lines={lotLines} metals={metals} total={total} />
      <MonthAccount caption="Crucibles" lines={crucibleLines} metals={metals} total={total} />
      <MonthCounts counts={month.counts} uncounted={month.uncounted} />
      {lossByAlloy.length === 0 ? (
        <p className="text-soft">No melt was closed in this month, so nothing is said about loss.</p>
      ) : (
        <div className="grid gap-x-14 gap-y-10 xl:grid-cols-2">
          <Losses caption="Loss by alloy" rates={lossByAlloy} />
          <Losses caption="Loss by caster" rates={lossByCaster} />
          <Losses caption="Loss by furnace" rates={lossByFurnace} />
          <Losses caption="Loss by terminal" rates={lossByTerminal} />
        </div>
      )}
    </div>
  );
};

/** A month of metal: what was there, came, went, was lost and is there now; the month stands in the address. */
export const MonthPage = () => {
  const { clock } = useStudio();
  const [search] = useSearchParams();
  const current = clock.dayOf(useNow(60_000)).slice(0, 7);
  const wanted = search.get('month') ?? current;
  const month = isMonth(wanted) ? wanted : current;
  const query = useQuery(reconciliationQuery(month));
  return (
    <>
      <PageTitle
        title={`Metal in ${monthWords(month)}`}
        summary={month === current ? 'So far; the month still runs.' : 'From its first day to its last.'}
        actions={<Steps month={month} current={current} />}
      />
      <Loaded query={query} what="the month">
        {(read) => <MonthView month={read} />}
      </Loaded>
    </>
  );
};
