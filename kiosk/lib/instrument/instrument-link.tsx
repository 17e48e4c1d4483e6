import { useState } from 'react';
import { Button } from '#src/ui/button.tsx';
import { StateMark } from '#src/ui/state-mark.tsx';
import { SerialSetup, type SerialSetupProps } from './serial-setup.tsx';

/** How it stands with an instrument, in a few words. */
const words = ({ name, view: { status, problem } }: Omit<SerialSetupProps, 'onClose'>): string => {
  if (problem !== null) return problem;
  switch (status) {
    case 'open':
      return `The ${name} is connected.`;
    case 'opening':
      return `Opening the ${name}’s port.`;
    case 'lost':
      return `The ${name} no longer answers: see to its cable and its switch.`;
    case 'closed':
    case 'unsupported':
      return '';
  }
};

/** Whether an instrument is connected, and the way to connect it; nothing in a browser that gives pages no serial port. */
export const InstrumentLink = (props: Omit<SerialSetupProps, 'onClose'>) => {
  const [isSettingUp, setIsSettingUp] = useState(false);
  const { name, view } = props;
  if (view.status === 'unsupported') return null;
  const text = words(props);
  const isDown = view.problem !== null || view.status === 'lost';
  return (
    <div className="grid justify-items-start gap-3">
      <span role="status">
        {text === '' ? null : <StateMark state={isDown ? 'caution' : 'ready'} text={text} size="desk" />}
      </span>
      {view.status === 'open' ? null : (
        <Button size="terminal" className="!min-h-18" onClick={() => setIsSettingUp(true)}>
          Connect the {name}
        </Button>
      )}
      {isSettingUp ? <SerialSetup {...props} onClose={() => setIsSettingUp(false)} /> : null}
    </div>
  );
};
