import type { Casting } from '#shared/contracts/casting.ts';
import { describeCastingState } from '#shared/domain/casting/casting-state.ts';
import { splitCode } from '#shared/lib/codes.ts';
import { CheckField } from '#src/ui/check-field.tsx';
import { Notice } from '#src/ui/notice.tsx';
import { useStudio } from '#src/desk/parts/use-studio.ts';

/** Props of {@link CastingChoice}. */
export interface CastingChoiceProps {
  readonly castings: readonly Casting[];
  readonly chosen: readonly string[];
  readonly onChoose: (ids: readonly string[]) => void;
}

/** Chooses the castings that one melt is to pour; those of another alloy than the first wait for a melt of their own. */
export const CastingChoice = ({ castings, chosen, onChoose }: CastingChoiceProps) => {
  const { mass, clock } = useStudio();
  if (castings.length === 0)
    return (
      <Notice kind="empty" title="No casting waits for metal.">
        A charge is planned for flasks that are on their way to the pour.
      </Notice>
    );
  const alloyId = castings.find(({ id }) => chosen.includes(id))?.alloy.revisionId;
  return (
    <fieldset className="grid gap-3">
      <legend className="pb-3 text-[19px] font-black">Castings of one melt</legend>
      {castings.map(({ id, flask, alloy, state, plannedMetalG, plannedPourAt, tree }) => (
        <CheckField
          key={id}
          label={`${splitCode(flask.code).main}, ${alloy.name} ${alloy.fineness}, ${mass(plannedMetalG)}`}
          hint={`${tree.description}; ${describeCastingState(state)}, pour planned ${clock.dayAndTime(plannedPourAt)}`}
          checked={chosen.includes(id)}
          disabled={alloyId !== undefined && alloyId !== alloy.revisionId}
          onChange={({ target }) =>
            onChoose(target.checked ? [...chosen, id] : chosen.filter((other) => other !== id))
          }
        />
      ))}
    </fieldset>
  );
};
