import { Button } from '#src/ui/button.tsx';
import { MessageScreen } from '#kiosk/lib/message-screen.tsx';

/** What is shown when a screen of ours fails; records already made are kept and delivered after the reload. */
export const BrokenScreen = () => (
  <MessageScreen
    state="stop"
    mark="This screen failed"
    sentence="Load the page again. What you have recorded is kept, and the card comes back to the same step."
    actions={
      <Button kind="main" size="terminal" onClick={() => window.location.reload()}>
        Load again
      </Button>
    }
  />
);
