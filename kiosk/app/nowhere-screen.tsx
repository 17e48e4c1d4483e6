import { useNavigate } from 'react-router-dom';
import { Button } from '#src/ui/button.tsx';
import { MessageScreen } from '#kiosk/lib/message-screen.tsx';

/** An address the terminal does not have. */
export const NowhereScreen = () => {
  const navigate = useNavigate();
  return (
    <MessageScreen
      state="caution"
      mark="Nothing here"
      sentence="This terminal has no such page. Go back and scan a flask."
      actions={
        <Button kind="main" size="terminal" onClick={() => void navigate('/')}>
          Back to standby
        </Button>
      }
    />
  );
};
