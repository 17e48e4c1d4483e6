import type { FormPart } from './form-parts.ts';
import { NumberField } from './number-field.tsx';

/** The limits at which a pour card stops or marks a departure. */
export const LimitFields = (part: FormPart) => (
  <div className="grid max-w-3xl items-start gap-5 sm:grid-cols-2">
    <NumberField
      path="limits.chargeTolerance"
      label="Charge off its planned mass, at most"
      unit="%"
      {...part}
    />
    <NumberField path="limits.returnsShare" label="Returns in a charge, at most" unit="%" {...part} />
    <NumberField
      path="limits.lossShare"
      label="Loss that marks a melt"
      unit="%"
      hint="Of the metal in."
      {...part}
    />
    <NumberField
      path="limits.furnaceMaxC"
      label="The hottest a furnace goes"
      unit="°C"
      hint="A higher reading is refused."
      {...part}
    />
    <NumberField
      path="limits.questionAboveC"
      label="A reading is questioned"
      unit="°C"
      hint="So far above the pour window."
      {...part}
    />
    <NumberField
      path="limits.countersignFactor"
      label="A second person signs for a departure"
      unit="times its limit"
      hint="An apprentice always asks for one."
      {...part}
    />
    <NumberField
      path="pyrometerCheckDays"
      label="Instruments are checked every"
      unit="days"
      hint="At a freezing point; later it is overdue."
      {...part}
    />
  </div>
);
