import type { ReactNode } from 'react';
import { useNavigate } from 'react-router-dom';
import { Button } from '#src/ui/button.tsx';
import { MessageScreen } from '#kiosk/lib/message-screen.tsx';

/** Props of {@link RefusedCode}. */
export interface RefusedCodeProps {
  readonly code: string;
  readonly sentence: string;
  /** A further button, when asking again may help. */
  readonly retry?: ReactNode;
}

const longestShown = 40;

/** A code that was not taken: what is wrong and what to do. */
export const RefusedCode = ({ code, sentence, retry }: RefusedCodeProps) => {
  const navigate = useNavigate();
  const shown = code.length > longestShown ? `${code.slice(0, longestShown)} …` : code;
  return (
    <MessageScreen
      state="caution"
      mark="Not taken"
      sentence={sentence}
      actions={
        <>
          {retry}
          <Button
            kind="main"
            size="terminal"
            icon="scan"
            onClick={() => void navigate('/', { replace: true })}
          >
            Scan another
          </Button>
        </>
      }
    >
      {shown === '' ? null : (
        <p className="break-words">
          Read: <span className="font-extrabold text-ink">{shown}</span>
        </p>
      )}
    </MessageScreen>
  );
};
