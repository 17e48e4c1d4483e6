import { useState } from 'react';
import { parseDecimal } from '#shared/lib/decimal.ts';
import { toCelsius } from '#shared/lib/units.ts';
import { Button } from '#src/ui/button.tsx';
import { TextField } from '#src/ui/text-field.tsx';
import type { StudioWriting } from '../../parts/use-studio.ts';
import { writeDegrees } from './snap-temperature.ts';
import type { TemperatureInAddress } from './use-temperature-in-address.ts';

/** Lowest and highest temperature the phase model is asked about, °C. */
const modelSpan = { lowC: 200, highC: 1500 } as const;

interface Typed {
  readonly text: string;
  /** What stood there when typing began: a temperature moved since then takes the field back. */
  readonly atC: number;
}

/** Types the temperature the page is read at; what cannot be read stays, with the reason. */
export const TemperatureField = ({
  temperature: { atC, settle },
  studio,
}: {
  readonly temperature: TemperatureInAddress;
  readonly studio: StudioWriting;
}) => {
  const [typed, setTyped] = useState<Typed | null>(null);
  const [error, setError] = useState<string | undefined>();
  const unit = studio.units.temperature;
  const shown = typed?.atC === atC ? typed.text : writeDegrees(atC, unit);

  const go = (): void => {
    const value = parseDecimal(shown);
    if (!value.ok) return setError(value.error);
    const celsius = Number(toCelsius(value.value, unit).toFixed(2));
    if (celsius < modelSpan.lowC || celsius > modelSpan.highC) {
      return setError(
        `The model holds from ${studio.temperature(modelSpan.lowC)} to ${studio.temperature(modelSpan.highC)}.`,
      );
    }
    setError(undefined);
    setTyped(null);
    settle(celsius);
  };
  return (
    <form
      noValidate
      className="screen-only flex flex-wrap items-end gap-3"
      onSubmit={(event) => {
        event.preventDefault();
        go();
      }}
    >
      <div className="w-44">
        <TextField
          label="Read it at"
          unit={`°${unit}`}
          inputMode="decimal"
          autoComplete="off"
          value={shown}
          error={typed?.atC === atC ? error : undefined}
          onChange={(event) => setTyped({ text: event.target.value, atC })}
        />
      </div>
      <Button type="submit">Go there</Button>
      <p className="basis-72 grow pb-2 text-[15px] leading-snug text-soft">
        Drag the line in the picture, or move it by the arrow keys: one degree a press, ten with shift.
      </p>
    </form>
  );
};
