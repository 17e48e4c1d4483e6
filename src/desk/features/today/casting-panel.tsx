import { Link } from 'react-router-dom';
import type { Casting } from '#shared/contracts/casting.ts';
import { castingMethodNames } from '#shared/domain/casting/casting-method.ts';
import { openCastingStates } from '#shared/domain/casting/casting-state.ts';
import { splitCode } from '#shared/lib/codes.ts';
import { AlloyChip } from '#src/ui/alloy-chip.tsx';
import { DefinitionList } from '#src/ui/definition-list.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { CardFiguresList } from '../../parts/card-figures-list.tsx';
import { CastingStateMark } from '../../parts/casting-state-mark.tsx';
import { metalOf } from '../../parts/metal-of.ts';
import { useCastingFigures } from '../../parts/use-casting-figures.ts';
import { useStudio } from '../../parts/use-studio.ts';
import { CastingMoves } from './casting-moves.tsx';

const link = 'rounded-md font-extrabold underline decoration-2 underline-offset-4';

const Figures = ({ casting }: { readonly casting: Casting }) => {
  const found = useCastingFigures(casting);
  if (!found) return null;
  return (
    <div>
      <CardFiguresList
        figures={found.figures}
        only={['pour', 'meltHold', 'flaskHold', 'flaskPour', 'pourWindow', 'quench']}
        className="grid grid-cols-2 gap-x-3 gap-y-1"
      />
      <p className="mt-2 px-1 text-[15px] text-soft">
        {found.from === 'melt book'
          ? 'As fixed when the card was opened.'
          : 'By the studio’s tables now; fixed when the card is opened.'}
      </p>
    </div>
  );
};

/** Props of {@link CastingPanel}. */
export interface CastingPanelProps {
  readonly casting: Casting;
  readonly isRunning: boolean;
  /** True when nobody chose it and it stands here because it pours next. */
  readonly isNext: boolean;
}

/** One casting beside its day: what it is, its card's figures, what may be done with it, and its papers. */
export const CastingPanel = ({ casting, isRunning, isNext }: CastingPanelProps) => {
  const { clock, mass } = useStudio();
  const { flask, alloy, tree, caster, melt } = casting;
  const place = [casting.bay, caster?.name ?? 'no caster set', castingMethodNames[casting.method]].join(', ');
  return (
    <section
      aria-labelledby="casting"
      className="grid content-start gap-4 rounded-[22px] border-2 border-line bg-panel px-[22px] py-5"
    >
      <header className="grid justify-items-start gap-1.5">
        {isNext ? <p className="text-[15px] font-extrabold text-soft">Pours next</p> : null}
        <AlloyChip name={alloy.name} fineness={String(alloy.fineness)} metal={metalOf(alloy.family)} />
        <h2 id="casting" className="text-[22px] font-black">
          {splitCode(flask.code).main} at {clock.time(casting.plannedPourAt)}
        </h2>
        <p className="text-soft first-letter:uppercase">{place}</p>
        {isRunning ? (
          <StateMark state="wait" text="at the furnace" size="row" />
        ) : (
          <CastingStateMark state={casting.state} />
        )}
        {casting.stateReason ? <p className="font-bold">“{casting.stateReason}”</p> : null}
      </header>
      <DefinitionList
        items={[
          { term: 'Metal', value: mass(casting.plannedMetalG) },
          { term: 'Tree', value: `${tree.description}, ${tree.pieces}` },
          { term: 'Thinnest section', value: `${tree.thinnestSectionMm} mm` },
          { term: 'Flask', value: `${flask.diameterMm} × ${flask.heightMm} mm` },
          { term: 'Planned by', value: casting.plannedBy },
        ]}
      />
      <Figures casting={casting} />
      <CastingMoves key={casting.id} casting={casting} />
      <ul className="screen-only grid gap-2 border-t-2 border-line pt-4">
        {melt ? (
          <li>
            <Link to={`/melts/${melt.id}`} className={link}>
              Melt {melt.code} in the melt book
            </Link>
          </li>
        ) : null}
        {openCastingStates.includes(casting.state) ? (
          <li>
            <Link to={`/print/castings/${casting.id}`} className={link}>
              Print the traveller card
            </Link>
          </li>
        ) : null}
        <li>
          <Link to={`/print/flasks/${flask.code}`} className={link}>
            Print the flask’s plate
          </Link>
        </li>
      </ul>
    </section>
  );
};
