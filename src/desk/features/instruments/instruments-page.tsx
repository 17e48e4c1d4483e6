import { useQuery } from '@tanstack/react-query';
import type { Instrument } from '#shared/contracts/instrument.ts';
import { flaskCoolingQuery } from '#src/api/flask-cooling.ts';
import { instrumentsQuery } from '#src/api/instruments.ts';
import { Button } from '#src/ui/button.tsx';
import { Notice } from '#src/ui/notice.tsx';
import { PageTitle } from '#src/ui/page-title.tsx';
import { Loaded } from '#src/desk/parts/loaded.tsx';
import { useDeskSession } from '#src/desk/parts/desk-session.ts';
import { CoolingSizes } from './cooling-sizes.tsx';
import { InstrumentForm } from './instrument-form.tsx';
import { InstrumentList } from './instrument-list.tsx';

const Overdue = ({ instruments }: { readonly instruments: readonly Instrument[] }) => {
  const late = instruments.filter(({ active, due }) => active && due?.state === 'overdue');
  if (late.length === 0) return null;
  const names = late.map(({ name }) => name).join(', ');
  return (
    <div className="mb-6">
      <Notice kind="caution" title={`Check overdue: ${names}.`}>
        Until it is checked again, a cooling curve it logs is judged as if it had never been checked.
      </Notice>
    </div>
  );
};

/** The studio's thermometers, pyrometers and balances, their checks, and how its flasks cool. */
export const InstrumentsPage = () => {
  const { abilities } = useDeskSession();
  const instruments = useQuery({ ...instrumentsQuery, refetchInterval: 10_000 });
  const cooling = useQuery(flaskCoolingQuery);
  return (
    <>
      <PageTitle
        title="Instruments"
        summary="What reads temperature and mass, how true it reads, and what its readings say of the flasks."
        actions={
          <Button icon="print" onClick={() => window.print()}>
            Print
          </Button>
        }
      />
      <Loaded query={instruments} what="the instruments">
        {(list) => (
          <>
            <Overdue instruments={list} />
            <div className="grid items-start gap-x-14 gap-y-12 xl:grid-cols-[minmax(0,1fr)_360px]">
              <InstrumentList instruments={list} />
              {abilities.editStudio ? <InstrumentForm /> : null}
            </div>
          </>
        )}
      </Loaded>
      <section aria-labelledby="cooling" className="mt-14 grid gap-4">
        <h2 id="cooling" className="text-[21px] font-black">
          How flasks cool
        </h2>
        <p className="max-w-[75ch] text-soft">
          By Newton’s law a mould loses the same share of its excess over the room in every minute. A card
          uses what was fitted to the studio’s own readings of that flask size where there are enough, else
          the table of the studio’s settings.
        </p>
        <Loaded query={cooling} what="how flasks cool">
          {(sizes) => <CoolingSizes sizes={sizes} />}
        </Loaded>
      </section>
    </>
  );
};
