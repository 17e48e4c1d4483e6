import type { FormPart } from './form-parts.ts';
import { NumberField } from './number-field.tsx';
import { SourceField } from './source-field.tsx';

/** The single figures from which cards are computed, each beside its source. */
export const ProcessFields = (part: FormPart) => (
  <div className="grid items-start gap-x-8 gap-y-6 sm:grid-cols-[240px_minmax(0,1fr)]">
    <NumberField
      path="processTables.flaskDropC"
      label="A mould may cool before the pour by"
      unit="°C"
      {...part}
    />
    <SourceField of="flaskDrop" label="Source of the allowed cooling" {...part} />
    <NumberField path="processTables.transferDropC" label="Metal loses on its way" unit="°C" {...part} />
    <SourceField of="transferDrop" label="Source of the loss on the way" {...part} />
    <NumberField path="processTables.waxDensityGPerCm3" label="Density of the wax" unit="g/cm³" {...part} />
    <SourceField of="wax" label="Source of the wax’s density" {...part} />
    <NumberField path="processTables.buttonShare" label="Button, on top of the wax" unit="%" {...part} />
    <SourceField of="button" label="Source of the button’s share" {...part} />
    <NumberField path="processTables.roomC" label="The room" unit="°C" {...part} />
  </div>
);
