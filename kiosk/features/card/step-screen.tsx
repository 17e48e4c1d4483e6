import { CheckRun } from './check-run.tsx';
import { ChooseScreen } from './choose-screen.tsx';
import { CountersignScreen } from './countersign-screen.tsx';
import { HoldScreen } from './hold-screen.tsx';
import { PhotographScreen } from './photograph-screen.tsx';
import { ReadScreen } from './read-screen.tsx';
import { ScanScreen } from './scan-screen.tsx';
import type { StepProps } from './skip-step.tsx';
import { WaitScreen } from './wait-screen.tsx';
import { WeighScreen } from './weigh-screen.tsx';

/** The screen of one step of the instruction, by its kind; words and checks that follow one another share one. */
export const StepScreen = ({ running, step }: StepProps) => {
  switch (step.kind) {
    case 'say':
    case 'check':
      return <CheckRun running={running} />;
    case 'weigh':
      return <WeighScreen running={running} step={step} />;
    case 'read':
      return <ReadScreen running={running} step={step} />;
    case 'wait':
      return <WaitScreen running={running} step={step} />;
    case 'photograph':
      return <PhotographScreen running={running} step={step} />;
    case 'scan':
      return <ScanScreen running={running} step={step} />;
    case 'choose':
      return <ChooseScreen running={running} step={step} />;
    case 'countersign':
      return <CountersignScreen running={running} step={step} />;
    case 'hold-to-act':
      return <HoldScreen running={running} step={step} />;
  }
};
