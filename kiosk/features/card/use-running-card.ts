import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import type { PourCard } from '#shared/contracts/card.ts';
import { applyEvent } from '#shared/domain/pour-card/apply-event.ts';
import type { Countersigned } from '#shared/domain/instruction/instruction-step.ts';
import type { CardState } from '#shared/domain/pour-card/card-state.ts';
import type { PersonAtTerminal } from '#shared/contracts/person.ts';
import { askCountersign } from '#kiosk/lib/ask-countersign.ts';
import { cardStateOf, pendingOf } from '#kiosk/lib/card-state-of.ts';
import { usePresence, type Presence } from '#kiosk/lib/presence.ts';
import { serverNow } from '#kiosk/lib/server-clock.ts';
import { unitWriter, type UnitWriter } from '#kiosk/lib/unit-writer.ts';
import { useOutbox, useOutboxView } from '#kiosk/outbox/outbox-context.ts';
import type { DoneEvent } from '#kiosk/outbox/outbox-entry.ts';
import { usePhotographBox } from '#kiosk/outbox/photograph-context.ts';

/** A walk on which nothing is recorded. */
export interface Practice {
  /** A walk at the terminal, or the desk's preview of an instruction, which knows nobody of the studio. */
  readonly kind: 'walk' | 'preview';
  /** Lets time pass that a real card would have to wait, s. */
  readonly passTime: (seconds: number) => void;
}

/** A running card as its steps see it. */
export interface RunningCard {
  readonly card: PourCard & { readonly melt: NonNullable<PourCard['melt']> };
  readonly state: CardState;
  readonly person: Presence['person'];
  /** Writes in the units the card was opened with, which are those of its own sentences. */
  readonly write: UnitWriter;
  /** Records that something has just happened; false when the card's own rules refuse it, which is then told. */
  readonly record: (event: DoneEvent) => boolean;
  /** Why the last record was not taken, in one sentence; null when it was. */
  readonly refusal: string | null;
  readonly dismissRefusal: () => void;
  /** How many of this card's records the server does not have yet. */
  readonly waiting: number;
  /** Someone else whose records on this card still wait for their sign-in. */
  readonly waitsFor: string | null;
  /** Null on a card that counts. */
  readonly practice: Practice | null;
  /** Takes another person's sign; rejects with why it was not taken. */
  readonly sign: (signer: PersonAtTerminal, pin: string) => Promise<Countersigned>;
  /** Keeps a photograph on its way to the melt book; resolves to the mark that events name it by. */
  readonly keepPhotograph: (picture: Blob) => Promise<string>;
  /** Leaves the card for whatever comes next. */
  readonly leave: () => void;
}

/** Folds a card with what is on its way, and records further events through the outbox. */
export const useRunningCard = (card: RunningCard['card']): RunningCard => {
  const { person } = usePresence();
  const outbox = useOutbox();
  const photographs = usePhotographBox();
  const navigate = useNavigate();
  const { entries, refusals } = useOutboxView();
  const [ownRefusal, setOwnRefusal] = useState<string | null>(null);
  const castingId = card.casting.id;
  const pending = pendingOf(card, entries);
  const refused = refusals.find((refusal) => refusal.castingId === castingId);

  const record = (event: DoneEvent): boolean => {
    const occurredAt = serverNow();
    // Folded anew, so that two presses within one drawing of the screen are judged one after the other.
    const now = cardStateOf(card, outbox.view().entries);
    const applied = applyEvent(now, { event, occurredAt }, card.context);
    setOwnRefusal(applied.ok ? null : applied.error);
    if (!applied.ok) return false;
    void outbox.add({
      key: crypto.randomUUID(),
      castingId,
      meltId: card.melt.id,
      personId: person.id,
      personName: person.name,
      occurredAt,
      event,
    });
    return true;
  };

  return {
    card,
    state: cardStateOf(card, entries),
    person,
    write: unitWriter(card.context.units),
    record,
    refusal: ownRefusal ?? refused?.sentence ?? null,
    dismissRefusal: () => {
      setOwnRefusal(null);
      if (refused) outbox.dismiss(refused.key);
    },
    waiting: pending.length,
    waitsFor: pending.find(({ personId }) => personId !== person.id)?.personName ?? null,
    practice: null,
    sign: ({ id }, pin) => askCountersign({ meltId: card.melt.id, personId: id, pin }),
    keepPhotograph: async (picture) => {
      const id = crypto.randomUUID();
      await photographs.add({ id, meltId: card.melt.id, personId: person.id, takenAt: serverNow(), picture });
      return id;
    },
    leave: () => void navigate('/', { replace: true }),
  };
};
