import { useState } from 'react';
import type { Casting } from '#shared/contracts/casting.ts';
import { castingStatesByHand, needsReason, type CastingState } from '#shared/domain/casting/casting-state.ts';
import { useMoveCasting } from '#src/api/castings.ts';
import { sentenceOf } from '#src/lib/http.ts';
import { Button } from '#src/ui/button.tsx';
import { FormProblem } from '#src/desk/parts/form-problem.tsx';
import { moveWords } from './move-words.ts';
import { ReasonDialog } from './reason-dialog.tsx';

/** The states this casting may be taken to by hand; holding and scrapping ask for a reason first. */
export const CastingMoves = ({ casting }: { readonly casting: Casting }) => {
  const move = useMoveCasting();
  const [asking, setAsking] = useState<CastingState | null>(null);
  const states = castingStatesByHand(casting.state);
  if (!casting.abilities.move || states.length === 0) return null;
  const press = (to: CastingState): void => {
    if (needsReason(to)) setAsking(to);
    else move.mutate({ id: casting.id, to });
  };
  return (
    <section aria-labelledby="moves" className="screen-only grid gap-3">
      <h3 id="moves" className="font-black">
        {casting.state === 'held' ? 'Let it go on, or scrap it' : 'Take it on'}
      </h3>
      <FormProblem sentence={move.error ? sentenceOf(move.error) : undefined} />
      <p className="flex flex-wrap gap-2.5">
        {states.map((to) => (
          <Button key={to} busy={move.isPending && move.variables.to === to} onClick={() => press(to)}>
            {moveWords(casting.state, to)}
          </Button>
        ))}
      </p>
      {asking ? <ReasonDialog casting={casting} to={asking} onClose={() => setAsking(null)} /> : null}
    </section>
  );
};
