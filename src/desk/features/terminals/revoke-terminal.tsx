import { useState } from 'react';
import type { Terminal } from '#shared/contracts/terminal.ts';
import { useRevokeTerminal } from '#src/api/terminals.ts';
import { sentenceOf } from '#src/lib/http.ts';
import { Button } from '#src/ui/button.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { FormProblem } from '../../parts/form-problem.tsx';

/** Ends a terminal, after asking. */
export const RevokeTerminal = ({ terminal }: { readonly terminal: Terminal }) => {
  const [asking, setAsking] = useState(false);
  const revoke = useRevokeTerminal();
  const end = (): void => revoke.mutate(terminal.id, { onSuccess: () => setAsking(false) });
  return (
    <>
      <Button kind="quiet" aria-label={`End it: ${terminal.name}`} onClick={() => setAsking(true)}>
        End it
      </Button>
      <Dialog
        open={asking}
        onClose={() => setAsking(false)}
        title={`End ${terminal.name}?`}
        actions={
          <>
            <Button kind="main" busy={revoke.isPending} onClick={end}>
              End the terminal
            </Button>
            <Button onClick={() => setAsking(false)}>Keep it</Button>
          </>
        }
      >
        <div className="grid gap-4">
          <p>
            Nobody can sign in at {terminal.name} any more, and a card open there stops being written. What it
            has already recorded stays. To use the device again, enrol it with a new code.
          </p>
          <FormProblem sentence={revoke.error ? sentenceOf(revoke.error) : undefined} />
        </div>
      </Dialog>
    </>
  );
};
