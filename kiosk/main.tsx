import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { setPlace } from '#src/lib/http.ts';
import { createQueryClient } from '#src/lib/query-client.ts';
import { TerminalApp } from './app/terminal-app.tsx';
import { createTerminalRouter } from './app/router.tsx';
import { watchServerTime } from './app/watch-server-time.ts';
import { deliverToServer } from './outbox/deliver-to-server.ts';
import { deliverPhotographs } from './outbox/photograph-context.ts';

setPlace('terminal');
const client = createQueryClient();
watchServerTime(client);
const outbox = deliverToServer(client);
const photographs = deliverPhotographs();
const root = document.getElementById('root');
if (!root) throw new Error('The page has no place for the terminal.');

// What waited before a reload is known before the first step is drawn, so that a card never seems to go back.
void Promise.all([outbox.load(), photographs.load()]).then(() => {
  createRoot(root).render(
    <StrictMode>
      <TerminalApp
        client={client}
        outbox={outbox}
        photographs={photographs}
        router={createTerminalRouter()}
      />
    </StrictMode>,
  );
});
