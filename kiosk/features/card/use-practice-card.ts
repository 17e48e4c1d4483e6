import { useEffect, useMemo, useState } from 'react';
import type { PersonAtTerminal } from '#shared/contracts/person.ts';
import type { Countersigned } from '#shared/domain/instruction/instruction-step.ts';
import { workerRoleOf } from '#shared/domain/people/apprenticeship.ts';
import { applyEvent, foldCard } from '#shared/domain/pour-card/apply-event.ts';
import type { TimedCardEvent } from '#shared/domain/pour-card/card-event.ts';
import { usePresence } from '#kiosk/lib/presence.ts';
import { serverNow } from '#kiosk/lib/server-clock.ts';
import { unitWriter } from '#kiosk/lib/unit-writer.ts';
import { forgetDrafts } from '#kiosk/lib/use-draft.ts';
import type { Practice, RunningCard } from './use-running-card.ts';

/** What a practice is walked on, and where it leads after. */
export interface PracticeSetUp {
  readonly card: RunningCard['card'];
  readonly kind: Practice['kind'];
  readonly onLeave: () => void;
}

const earlier =
  (seconds: number) =>
  (timed: TimedCardEvent): TimedCardEvent => ({
    ...timed,
    occurredAt: new Date(Date.parse(timed.occurredAt) - seconds * 1000).toISOString(),
  });

const signInPractice = ({ id, name }: PersonAtTerminal): Countersigned => ({
  id: crypto.randomUUID(),
  personId: id,
  name,
  onDevice: true,
});

/** Folds a card in memory: nothing is sent and nothing is kept, so that it can be walked without a record. */
export const usePracticeCard = ({ card: shown, kind, onLeave }: PracticeSetUp): RunningCard => {
  const { person } = usePresence();
  const [meltId] = useState(() => crypto.randomUUID());
  const [refusal, setRefusal] = useState<string | null>(null);
  const [events, setEvents] = useState<readonly TimedCardEvent[]>(() => {
    const worker = { personId: person.id, role: workerRoleOf(person.roles), parts: null };
    return [{ event: { type: 'card-opened', worker }, occurredAt: serverNow() }];
  });
  const { context } = shown;
  const state = useMemo(() => foldCard(events, context), [events, context]);
  useEffect(() => () => forgetDrafts(meltId), [meltId]);

  const record: RunningCard['record'] = (event) => {
    const timed = { event, occurredAt: serverNow() };
    const applied = applyEvent(state, timed, context);
    setRefusal(applied.ok ? null : applied.error);
    if (!applied.ok) return false;
    setEvents((before) =>
      applyEvent(foldCard(before, context), timed, context).ok ? [...before, timed] : before,
    );
    return true;
  };

  return {
    card: { ...shown, melt: { ...shown.melt, id: meltId }, events: [] },
    state,
    person,
    write: unitWriter(context.units),
    record,
    refusal,
    dismissRefusal: () => setRefusal(null),
    waiting: 0,
    waitsFor: null,
    practice: { kind, passTime: (seconds) => setEvents((before) => before.map(earlier(seconds))) },
    sign: (signer) => Promise.resolve(signInPractice(signer)),
    keepPhotograph: () => Promise.resolve(crypto.randomUUID()),
    leave: onLeave,
  };
};
