import { QueryClientProvider, type QueryClient } from '@tanstack/react-query';
import { RouterProvider } from 'react-router-dom';
import { OutboxContext } from '#kiosk/outbox/outbox-context.ts';
import type { Outbox } from '#kiosk/outbox/outbox.ts';
import type { PhotographBox } from '#kiosk/outbox/photograph-box.ts';
import { PhotographContext } from '#kiosk/outbox/photograph-context.ts';
import type { createTerminalRouter } from './router.tsx';

/** Props of {@link TerminalApp}. */
export interface TerminalAppProps {
  readonly client: QueryClient;
  readonly outbox: Outbox;
  readonly photographs: PhotographBox;
  readonly router: ReturnType<typeof createTerminalRouter>;
}

/** The terminal's application with everything its screens need around them. */
export const TerminalApp = ({ client, outbox, photographs, router }: TerminalAppProps) => (
  <QueryClientProvider client={client}>
    <OutboxContext value={outbox}>
      <PhotographContext value={photographs}>
        <RouterProvider router={router} />
      </PhotographContext>
    </OutboxContext>
  </QueryClientProvider>
);
