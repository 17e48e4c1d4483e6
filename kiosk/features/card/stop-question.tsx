import type { ReactNode } from 'react';
import { stopReasons, type StopReason } from '#shared/domain/pour-card/card-event.ts';
import { Button } from '#src/ui/button.tsx';
import { TerminalFrame } from '#src/ui/terminal-frame.tsx';

/** Props of {@link StopQuestion}. */
export interface StopQuestionProps {
  readonly top: ReactNode;
  readonly emergencyText: string;
  readonly onReason: (reason: StopReason) => void;
  readonly onBack: () => void;
}

/** The reasons to stop in a word or two. */
export const stopReasonWords: Readonly<Record<StopReason, string>> = {
  spill: 'A spill',
  burn: 'A burn',
  equipment: 'Equipment',
  other: 'Something else',
};

/** Right after stop work: what to do now, in large letters, and one question. */
export const StopQuestion = ({ top, emergencyText, onReason, onBack }: StopQuestionProps) => (
  <TerminalFrame
    top={top}
    sentence="Stop. What has happened?"
    gauge={
      <div role="group" aria-label="Why work stops" className="grid gap-4">
        {stopReasons.map((reason) => (
          <Button
            key={reason}
            size="terminal"
            className="!min-h-26 text-[34px]"
            onClick={() => onReason(reason)}
          >
            {stopReasonWords[reason]}
          </Button>
        ))}
      </div>
    }
    actions={
      <Button size="terminal" icon="back" onClick={onBack}>
        Nothing. Go on with the work
      </Button>
    }
  >
    <p className="text-[38px] leading-tight font-black text-pretty">{emergencyText}</p>
  </TerminalFrame>
);
