import { createBrowserRouter } from 'react-router-dom';
import { CardScreen } from '#kiosk/features/card/card-screen.tsx';
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
          { path: '*', element: <NowhereScreen /> },
        ],
      },
    ],
    { basename: '/kiosk' },
  );
