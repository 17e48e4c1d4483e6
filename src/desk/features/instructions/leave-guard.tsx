import { useEffect } from 'react';
import { useBlocker } from 'react-router-dom';
import { Button } from '#src/ui/button.tsx';
import { Dialog } from '#src/ui/dialog.tsx';

/** Asks before a page with unstored changes is left, within the desk and out of it. */
export const LeaveGuard = ({ isChanged }: { readonly isChanged: boolean }) => {
  const blocker = useBlocker(
    ({ currentLocation, nextLocation }) => isChanged && currentLocation.pathname !== nextLocation.pathname,
  );
  useEffect(() => {
    if (!isChanged) return;
    const ask = (event: BeforeUnloadEvent): void => event.preventDefault();
    window.addEventListener('beforeunload', ask);
    return () => window.removeEventListener('beforeunload', ask);
  }, [isChanged]);
  if (blocker.state !== 'blocked') return null;
  return (
    <Dialog
      open
      onClose={blocker.reset}
      title="Leave without storing?"
      actions={
        <>
          <Button kind="main" onClick={blocker.reset}>
            Stay here
          </Button>
          <Button onClick={blocker.proceed}>Leave, drop my changes</Button>
        </>
      }
    >
      <p>What you changed in this draft has not been stored.</p>
    </Dialog>
  );
};
