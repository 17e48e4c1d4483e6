import { useState } from 'react';
import type { Instrument } from '#shared/contracts/instrument.ts';
import { useRevokeInstrument } from '#src/api/instruments.ts';
import { sentenceOf } from '#src/lib/http.ts';
import { Button } from '#src/ui/button.tsx';
import { Dialog } from '#src/ui/dialog.tsx';
import { FormProblem } from '#src/desk/parts/form-problem.tsx';

/** Ends an instrument, after asking. */
export const EndInstrument = ({ instrument }: { readonly instrument: Instrument }) => {
  const [asking, setAsking] = useState(false);
  const revoke = useRevokeInstrument();
  const end = (): void => revoke.mutate(instrument.id, { onSuccess: () => setAsking(false) });
  return (
    <>
      <Button kind="quiet" aria-label={`End it: ${instrument.name}`} onClick={() => setAsking(true)}>
        End it
      </Button>
      <Dialog
        open={asking}
        onClose={() => setAsking(false)}
        title={`End ${instrument.name}?`}
        actions={
          <>
            <Button kind="main" busy={revoke.isPending} onClick={end}>
              End the instrument
            </Button>
            <Button onClick={() => setAsking(false)}>Keep it</Button>
          </>
        }
      >
        <div className="grid gap-4">
          <p>Its token opens nothing any more. What it has sent, and its checks, stay.</p>
          <FormProblem sentence={revoke.error ? sentenceOf(revoke.error) : undefined} />
        </div>
      </Dialog>
    </>
  );
};
