import { useState } from 'react';
import { Button } from '#src/ui/button.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import type { SerialLines, SerialView } from './serial-lines.ts';
import { baudRates, framings } from './serial-settings.ts';

/** Props of {@link SerialSetup}. */
export interface SerialSetupProps {
  /** What the instrument is called, such as "balance". */
  readonly name: string;
  readonly view: SerialView;
  readonly lines: SerialLines;
  readonly onClose: () => void;
}

type FramingName = keyof typeof framings;

const nameOf = ({ dataBits, parity }: SerialView['framing']): FramingName =>
  (Object.keys(framings) as FramingName[]).find(
    (name) => framings[name].dataBits === dataBits && framings[name].parity === parity,
  ) ?? '8N1';

interface ChoicesProps<Value extends string | number> {
  readonly label: string;
  readonly values: readonly Value[];
  readonly chosen: Value;
  readonly onChoose: (value: Value) => void;
}

const Choices = <Value extends string | number>({ label, values, chosen, onChoose }: ChoicesProps<Value>) => (
  <div role="group" aria-label={label} className="grid gap-3">
    <p className="font-extrabold">{label}</p>
    <div className="grid grid-cols-4 gap-4">
      {values.map((value) => (
        <Button
          key={value}
          size="terminal"
          className="!min-h-18"
          aria-pressed={value === chosen}
          icon={value === chosen ? 'tick' : undefined}
          onClick={() => onChoose(value)}
        >
          {value}
        </Button>
      ))}
    </div>
  </div>
);

/** Speed and framing of an instrument's port, as set at the instrument itself, and the browser's question which port it is. */
export const SerialSetup = ({ name, view, lines, onClose }: SerialSetupProps) => {
  const [baudRate, setBaudRate] = useState(view.framing.baudRate);
  const [framing, setFraming] = useState(nameOf(view.framing));
  const choose = (): void => {
    void lines.choose({ baudRate, ...framings[framing] });
    onClose();
  };
  return (
    <Dialog
      open
      onClose={onClose}
      title={`How the ${name} sends`}
      size="terminal"
      actions={
        <Button kind="main" size="terminal" className="flex-1" onClick={choose}>
          Choose its port
        </Button>
      }
    >
      <div className="grid gap-6">
        <Choices
          label="Bits per second"
          values={baudRates}
          chosen={baudRate as (typeof baudRates)[number]}
          onChoose={setBaudRate}
        />
        <Choices
          label="Data bits, parity, stop bits"
          values={Object.keys(framings) as FramingName[]}
          chosen={framing}
          onChoose={setFraming}
        />
      </div>
    </Dialog>
  );
};
