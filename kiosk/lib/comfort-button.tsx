import { useState, type ReactNode } from 'react';
import { useTheme } from '#src/lib/theme.ts';
import { Button } from '#src/ui/button.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { Choice } from './choice.tsx';
import { changeComfort, soundLevels, useComfort, type SoundLevel } from './comfort.ts';
import { playSignal } from './signals.ts';

const soundWords: Readonly<Record<SoundLevel, string>> = { off: 'Off', quiet: 'Quiet', loud: 'Loud' };

const Row = ({ label, children }: { readonly label: string; readonly children: ReactNode }) => (
  <div role="group" aria-label={label} className="grid grid-cols-[170px_minmax(0,1fr)] items-center gap-4">
    <span className="text-2xl font-extrabold">{label}</span>
    <span className="flex gap-4">{children}</span>
  </div>
);

const ThemeRow = () => {
  const [theme, toggle] = useTheme();
  const choose = (wanted: typeof theme): void => {
    if (wanted !== theme) toggle();
  };
  return (
    <Row label="Light">
      <Choice isChosen={theme === 'day'} onChoose={() => choose('day')}>
        Day
      </Choice>
      <Choice isChosen={theme === 'melt-room'} onChoose={() => choose('melt-room')}>
        Melt room
      </Choice>
    </Row>
  );
};

const Settings = () => {
  const { hand, text, sound } = useComfort();
  const level = (next: SoundLevel): void => {
    changeComfort({ sound: next });
    playSignal('open');
  };
  return (
    <div className="grid gap-5">
      <ThemeRow />
      <Row label="Working hand">
        <Choice isChosen={hand === 'left'} onChoose={() => changeComfort({ hand: 'left' })}>
          Left
        </Choice>
        <Choice isChosen={hand === 'right'} onChoose={() => changeComfort({ hand: 'right' })}>
          Right
        </Choice>
      </Row>
      <Row label="Letters">
        <Choice isChosen={text === 'normal'} onChoose={() => changeComfort({ text: 'normal' })}>
          Normal
        </Choice>
        <Choice isChosen={text === 'large'} onChoose={() => changeComfort({ text: 'large' })}>
          Large
        </Choice>
      </Row>
      <Row label="Signals">
        {soundLevels.map((each) => (
          <Choice key={each} isChosen={each === sound} onChoose={() => level(each)}>
            {soundWords[each]}
          </Choice>
        ))}
      </Row>
    </div>
  );
};

/** Opens this device's own settings: light, working hand, size of letters, loudness; each holds at once. */
export const ComfortButton = () => {
  const [isOpen, setIsOpen] = useState(false);
  return (
    <>
      <Button
        size="terminal"
        icon="glove"
        className="!gap-3 !px-4 text-[28px] whitespace-nowrap"
        aria-haspopup="dialog"
        onClick={() => setIsOpen(true)}
      >
        Comfort
      </Button>
      <Dialog
        open={isOpen}
        onClose={() => setIsOpen(false)}
        title="This device"
        size="terminal"
        actions={
          <Button kind="main" size="terminal" className="flex-1" onClick={() => setIsOpen(false)}>
            Done
          </Button>
        }
      >
        <Settings />
      </Dialog>
    </>
  );
};
