import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useLocation, useNavigate } from 'react-router-dom';
import type { PersonAtTerminal } from '#shared/contracts/person.ts';
import type { Session } from '#shared/contracts/session.ts';
import { parseFlaskCode, splitCode } from '#shared/lib/codes.ts';
import { peopleAtTerminalQuery } from '#src/api/people.ts';
import { addressOfCode, looksScanned, refusalOfCode } from '#kiosk/lib/scan-target.ts';
import { useRememberedClocks } from '#kiosk/lib/remembered-clocks.ts';
import { RunningRow } from '#kiosk/lib/running-row.tsx';
import { ScanPanel } from '#kiosk/lib/scan-panel.tsx';
import { useServerNow } from '#kiosk/lib/server-clock.ts';
import { ComfortButton } from '#kiosk/lib/comfort-button.tsx';
import { useScanner } from '#kiosk/lib/use-scanner.ts';
import { WallClock } from '#kiosk/lib/wall-clock.tsx';
import { PhotographBadge } from '#kiosk/outbox/photograph-badge.tsx';
import { WaitingBadge } from '#kiosk/outbox/waiting-badge.tsx';
import { PeopleTiles } from './people-tiles.tsx';
import { PinEntry } from './pin-entry.tsx';
import { signInHeading } from './sign-in-heading.ts';

/** Props of {@link SignInScreen}. */
export interface SignInScreenProps {
  readonly terminal: NonNullable<Session['terminal']>;
}

const useWaitingFor = (): string | null => {
  const { pathname, search } = useLocation();
  const clocks = useRememberedClocks();
  if (pathname === '/scan') {
    const parsed = parseFlaskCode(new URLSearchParams(search).get('code') ?? '');
    return parsed.ok ? splitCode(parsed.value).main : null;
  }
  const castingId = /^\/cards\/(.+)$/.exec(pathname)?.[1];
  const running = clocks.find((clock) => clock.castingId === castingId);
  return running ? splitCode(running.flaskCode).main : null;
};

const RunningHere = () => {
  const clocks = useRememberedClocks();
  const nowMs = useServerNow();
  if (clocks.length === 0) return <div />;
  return (
    <section aria-label="Running at this terminal" className="border-b-[3px] border-line pb-2">
      {clocks.map((running) => (
        <RunningRow key={running.castingId} running={running} nowMs={nowMs} />
      ))}
    </section>
  );
};

/**
 * Nobody is signed in: the clocks that run at this terminal, a place to show a flask, and the people to choose from.
 * It lies over whatever address was open, which comes back after the sign-in; a scan is kept as the address.
 */
export const SignInScreen = ({ terminal }: SignInScreenProps) => {
  const [chosen, setChosen] = useState<PersonAtTerminal | null>(null);
  const [refusal, setRefusal] = useState<string | null>(null);
  const people = useQuery({ ...peopleAtTerminalQuery, refetchInterval: 30_000 });
  const nowMs = useServerNow();
  const navigate = useNavigate();
  const waitingFor = useWaitingFor();
  const takeCode = (code: string): void => {
    const wrong = refusalOfCode(code);
    setRefusal(wrong);
    if (wrong === null) void navigate(addressOfCode(code), { replace: true });
  };
  useScanner((code) => {
    // Digits alone may be a PIN typed fast; a code on a flask begins with its letter.
    if (chosen && !looksScanned(code)) return false;
    takeCode(code);
    return true;
  });
  return (
    <main className="grid fill-screen gap-8 bg-ground p-8 text-ink landscape:grid-cols-[minmax(0,470px)_minmax(0,1fr)] portrait:grid-rows-[auto_minmax(0,1fr)]">
      <div className="grid min-h-0 gap-6 landscape:grid-rows-[auto_minmax(0,1fr)_auto]">
        <WallClock nowMs={nowMs} place={terminal.bay} />
        {chosen ? <RunningHere /> : <ScanPanel onCode={takeCode} />}
        <div className="flex items-center gap-4">
          <ComfortButton />
          <WaitingBadge />
          <PhotographBadge />
        </div>
      </div>
      <div className="grid min-h-0 content-start gap-6 overflow-y-auto p-1">
        {chosen ? null : <RunningHere />}
        <h1 className="text-[40px] leading-tight font-black text-balance">
          {signInHeading(chosen, waitingFor)}
        </h1>
        {refusal ? (
          <p role="alert" className="text-[26px] font-extrabold">
            {refusal}
          </p>
        ) : null}
        {chosen ? (
          <PinEntry key={chosen.id} person={chosen} onBack={() => setChosen(null)} />
        ) : (
          <PeopleTiles people={people.data} error={people.error} onChoose={setChosen} />
        )}
      </div>
    </main>
  );
};
