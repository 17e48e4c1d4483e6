import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import type { PourCard } from '#shared/contracts/card.ts';
import { castingMethodNames } from '#shared/domain/casting/casting-method.ts';
import { cardQuery, openCard } from '#src/api/cards.ts';
import { dayAndTime } from '#src/lib/formats.ts';
import { sentenceOf } from '#src/lib/http.ts';
import { Button } from '#src/ui/button.tsx';
import { DefinitionList } from '#src/ui/definition-list.tsx';
import { HoldButton } from '#src/ui/hold-button.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { TerminalFrame } from '#src/ui/terminal-frame.tsx';
import { usePresence } from '#kiosk/lib/presence.ts';
import { serverNow } from '#kiosk/lib/server-clock.ts';
import { splitFigure, unitWriter } from '#kiosk/lib/unit-writer.ts';
import { CardFiguresGrid } from './card-figures-grid.tsx';
import { CardMenu } from './card-menu.tsx';
import { CardTop } from './card-top.tsx';

/** Opens a card at this terminal, or takes it along; one key for each press, so that a repeat records nothing new. */
export const useOpenCard = (castingId: string) => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ carryOn }: { readonly carryOn: boolean }) =>
      openCard(castingId, { key: crypto.randomUUID(), occurredAt: serverNow(), carryOn }),
    onSuccess: (card) => {
      client.setQueryData(cardQuery(castingId).queryKey, card);
      return client.invalidateQueries({ queryKey: ['castings'] });
    },
  });
};

const listOf = ({ casting }: PourCard) => [
  {
    term: 'Casting',
    value: `${castingMethodNames[casting.method]}, thinnest ${casting.tree.thinnestSectionMm} mm`,
  },
  { term: 'Tree', value: `${casting.tree.description}, ${casting.tree.pieces} pieces` },
  { term: 'Planned', value: `${dayAndTime(casting.plannedPourAt)} by ${casting.plannedBy}` },
];

/** A card before it is opened: every figure with where it comes from, and one action. */
export const CardPreview = ({ card }: { readonly card: PourCard }) => {
  const { studio } = usePresence();
  const write = unitWriter(studio.units);
  const navigate = useNavigate();
  const open = useOpenCard(card.casting.id);
  const metal = splitFigure(write.mass(card.context.plannedMetalG));
  return (
    <TerminalFrame
      top={<CardTop card={card} write={write} />}
      stop={<CardMenu card={card} write={write} />}
      sentence="Check the flask in your hand, then open its card."
      number={metal.figure}
      unit={metal.unit}
      state={
        open.error ? (
          <span role="alert">
            <StateMark state="caution" text={sentenceOf(open.error)} size="terminal" />
          </span>
        ) : undefined
      }
      gauge={
        <div className="grid content-start gap-3">
          <CardFiguresGrid card={card} write={write} />
          {card.rangeBasis === 'measured' ? (
            <StateMark state="caution" text="Measured range, not computed" size="desk" />
          ) : null}
        </div>
      }
      actions={
        <>
          <Button size="terminal" icon="back" onClick={() => void navigate('/')}>
            Another flask
          </Button>
          <HoldButton
            className="grow-2"
            disabled={!card.abilities.open || open.isPending}
            onHeld={() => open.mutate({ carryOn: false })}
          >
            {open.isPending ? 'Opening the card' : 'Hold to open the card'}
          </HoldButton>
        </>
      }
    >
      <DefinitionList items={listOf(card)} size="terminal" />
    </TerminalFrame>
  );
};
