import { useQuery } from '@tanstack/react-query';
import { Link, useNavigate } from 'react-router-dom';
import type { Casting } from '#shared/contracts/casting.ts';
import { castingsQuery } from '#src/api/castings.ts';
import { sentenceOf } from '#src/lib/http.ts';
import { buttonClass } from '#src/ui/button-class.ts';
import { Button } from '#src/ui/button.tsx';
import { Icon } from '#src/ui/icon.tsx';
import { Notice } from '#src/ui/notice.tsx';
import { Spinner } from '#src/ui/spinner.tsx';
import { firstName, usePresence } from '#kiosk/lib/presence.ts';
import { RunningRow } from '#kiosk/lib/running-row.tsx';
import { ScanPanel } from '#kiosk/lib/scan-panel.tsx';
import { addressOfCode } from '#kiosk/lib/scan-target.ts';
import { useServerNow } from '#kiosk/lib/server-clock.ts';
import { ComfortButton } from '#kiosk/lib/comfort-button.tsx';
import { unitWriter } from '#kiosk/lib/unit-writer.ts';
import { useScanner } from '#kiosk/lib/use-scanner.ts';
import { WallClock } from '#kiosk/lib/wall-clock.tsx';
import { PhotographBadge } from '#kiosk/outbox/photograph-badge.tsx';
import { useUndelivered } from '#kiosk/outbox/photograph-context.ts';
import { WaitingBadge } from '#kiosk/outbox/waiting-badge.tsx';
import { CastingRow } from './casting-row.tsx';
import { useOpenedCards } from './use-opened-cards.ts';

/** The terminal at rest: the time, a place to show a flask, cards that run here, and what comes next at this bay. */
export const Standby = () => {
  const { person, terminal } = usePresence();
  const nowMs = useServerNow();
  const navigate = useNavigate();
  const take = (code: string): void => void navigate(addressOfCode(code));
  useScanner((code) => {
    take(code);
    return true;
  });
  return (
    <main className="grid fill-screen gap-8 bg-ground p-8 text-ink landscape:grid-cols-[minmax(0,470px)_minmax(0,1fr)] portrait:grid-rows-[auto_minmax(0,1fr)]">
      <h1 className="sr-only">Standby</h1>
      <div className="grid min-h-0 gap-6 landscape:grid-rows-[auto_minmax(0,1fr)_auto]">
        <WallClock nowMs={nowMs} place={`${terminal.bay} · ${firstName(person.name)}`} />
        <ScanPanel onCode={take} />
        <Who />
      </div>
      <Work nowMs={nowMs} />
    </main>
  );
};

const Who = () => {
  const { signOut } = usePresence();
  const isWaiting = useUndelivered() > 0;
  return (
    <div className="terminal-actions">
      <ComfortButton />
      <Button
        size="terminal"
        icon="lock"
        className="!gap-3 !px-4"
        kind={isWaiting ? 'blocked' : 'plain'}
        onClick={signOut}
      >
        {isWaiting ? 'Sign-out waits' : 'Sign out'}
      </Button>
    </div>
  );
};

const Work = ({ nowMs }: { readonly nowMs: number }) => {
  const { data: castings, error } = useQuery(castingsQuery());
  return (
    <div className="min-h-0 overflow-y-auto p-1" tabIndex={0} role="region" aria-label="Work at this bay">
      <WaitingBadge />
      <PhotographBadge />
      {error && castings ? <p className="text-xl font-bold text-soft">{sentenceOf(error)}</p> : null}
      {castings ? (
        <Lists castings={castings} nowMs={nowMs} />
      ) : error ? (
        <Notice kind="error" size="terminal" title={sentenceOf(error)} />
      ) : (
        <Spinner label="Fetching the day’s castings" />
      )}
    </div>
  );
};

const isToCome = ({ state }: Casting): boolean => state !== 'poured' && state !== 'quenched';

const Lists = ({ castings, nowMs }: { readonly castings: readonly Casting[]; readonly nowMs: number }) => {
  const { terminal, studio } = usePresence();
  const write = unitWriter(studio.units);
  const opened = useOpenedCards(castings);
  const running = opened.flatMap(({ clock, isHere }) => (clock && isHere ? [clock] : []));
  const busy = new Set(opened.filter(({ clock }) => clock !== null).map(({ castingId }) => castingId));
  const toCome = castings.filter((casting) => isToCome(casting) && !busy.has(casting.id));
  const here = toCome.filter(({ bay }) => bay === terminal.bay);
  const elsewhere = toCome.length - here.length;
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-6">
      {running.length > 0 ? (
        <section aria-labelledby="running-heading">
          <h2 id="running-heading" className="text-[28px] font-black">
            Running here
          </h2>
          <ul className="mt-3 grid gap-4">
            {running.map((clock) => (
              <li key={clock.castingId}>
                <Link
                  to={`/cards/${clock.castingId}`}
                  className="block rounded-[26px] border-[3px] border-ink bg-panel px-6 py-2"
                >
                  <RunningRow running={clock} nowMs={nowMs} />
                </Link>
              </li>
            ))}
          </ul>
        </section>
      ) : null}
      <section aria-labelledby="next-heading">
        <h2 id="next-heading" className="mb-3 text-[28px] font-black">
          Next at this bay
        </h2>
        {here.length === 0 ? (
          <Notice kind="empty" size="terminal" title="Nothing waits at this bay.">
            The owner plans castings at the desk. Any flask that is holding can still be scanned here.
          </Notice>
        ) : (
          <ul>
            {here.map((casting) => (
              <CastingRow key={casting.id} casting={casting} nowMs={nowMs} write={write} />
            ))}
          </ul>
        )}
        {elsewhere > 0 ? (
          <p className="border-t-[3px] border-line pt-3 text-xl text-soft">
            {elsewhere === 1 ? 'One more' : `${elsewhere} more`} at other bays
          </p>
        ) : null}
      </section>
      <Link
        to="/practice"
        className={buttonClass({ size: 'terminal' }, 'justify-self-start !min-h-18 !gap-3 !px-5 text-[24px]')}
      >
        <Icon name="note" />
        Practise a card
      </Link>
    </div>
  );
};
