import { createBrowserRouter } from 'react-router-dom';
import { CardScreen } from '#kiosk/features/card/card-screen.tsx';
import { PracticeScreen } from '#kiosk/features/card/practice-screen.tsx';
import { FindFlask } from '#kiosk/features/scan/find-flask.tsx';
import { Standby } from '#kiosk/features/standby/standby.tsx';
import { BrokenScreen } from './broken-screen.tsx';
import { NowhereScreen } from './nowhere-screen.tsx';
import { Shell } from './shell.tsx';

/** The addresses of the terminal, all under `/kiosk`. */
export const createTerminalRouter = () =>
  createBrowserRouter(
    [
      {
        element: <Shell />,
        errorElement: <BrokenScreen />,
        children: [
          { index: true, element: <Standby /> },
          { path: 'scan', element: <FindFlask /> },
          { path: 'cards/:castingId', element: <CardScreen /> },
          { path: 'practice', element: <PracticeScreen /> },
          { path: '*', element: <NowhereScreen /> },
        ],
      },
      // Shown inside the desk, with the desk's session: no enrolment, no sign-in, nothing asked of the server.
      {
        path: 'preview',
        errorElement: <BrokenScreen />,
        lazy: async () => ({
          Component: (await import('#kiosk/features/card/preview-screen.tsx')).PreviewScreen,
        }),
      },
    ],
    { basename: '/kiosk' },
  );
