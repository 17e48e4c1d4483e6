import type { Casting } from '#shared/contracts/casting.ts';
import { markedMetal } from '#shared/domain/alloy/alloy-family.ts';
import { castingMethodNames } from '#shared/domain/casting/casting-method.ts';
import { describeCastingState } from '#shared/domain/casting/casting-state.ts';
import { splitCode } from '#shared/lib/codes.ts';
import { timeOfDay } from '#src/lib/formats.ts';
import { AlloyChip } from '#src/ui/alloy-chip.tsx';
import { FlaskPicture } from '#src/ui/flask-picture.tsx';
import { firstName } from '#kiosk/lib/presence.ts';
import type { UnitWriter } from '#kiosk/lib/unit-writer.ts';
import { colourTemperatureOf } from './state-colour.ts';
import { timeToPour } from './time-to-pour.ts';

/** Props of {@link CastingRow}. */
export interface CastingRowProps {
  readonly casting: Casting;
  readonly nowMs: number;
  readonly write: UnitWriter;
}

/** One casting that is still to come: when, which flask, which metal, who. */
export const CastingRow = ({ casting, nowMs, write }: CastingRowProps) => {
  const { alloy, flask, state, stateReason } = casting;
  const isWaiting = state !== 'holding';
  const words =
    stateReason === '' ? describeCastingState(state) : `${describeCastingState(state)}: ${stateReason}`;
  return (
    <li className="flex items-center gap-5 border-t-[3px] border-line py-2.5">
      <div className="w-34 shrink-0">
        <time dateTime={casting.plannedPourAt} className="block text-[42px] leading-none font-black">
          {timeOfDay(casting.plannedPourAt)}
        </time>
        <span className="text-xl font-bold text-soft">{timeToPour(casting.plannedPourAt, nowMs)}</span>
      </div>
      <FlaskPicture temperatureC={colourTemperatureOf(state)} />
      <div className="grid min-w-0 gap-0.5">
        <p className="flex flex-wrap items-center gap-x-3 gap-y-1 text-[28px] leading-tight font-black">
          {splitCode(flask.code).main}
          <AlloyChip
            name={alloy.name}
            fineness={String(alloy.fineness)}
            metal={markedMetal(alloy.family) === 'Ag' ? 'silver' : 'gold'}
            size="terminal"
          />
        </p>
        <p className="text-xl text-soft">
          {write.mass(casting.plannedMetalG)}, {castingMethodNames[casting.method]}
        </p>
        {isWaiting ? <p className="text-xl font-bold text-soft">{words}</p> : null}
      </div>
      <span className="ml-auto text-[22px] font-extrabold text-soft">
        {casting.caster ? firstName(casting.caster.name) : 'anyone'}
      </span>
    </li>
  );
};
