import { QueryClientProvider } from '@tanstack/react-query';
import { useState } from 'react';
import { RouterProvider } from 'react-router-dom';
import { createQueryClient } from '#src/lib/query-client.ts';
import { createDeskRouter } from './create-desk-router.tsx';
import { watchForEndedSession } from './watch-for-ended-session.ts';

/** The owner's application: its data, its addresses, its pages. */
export const App = () => {
  const [client] = useState(() => watchForEndedSession(createQueryClient()));
  const [router] = useState(createDeskRouter);
  return (
    <QueryClientProvider client={client}>
      <RouterProvider router={router} />
    </QueryClientProvider>
  );
};
