import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { setPlace } from '#src/lib/http.ts';
import { App } from './app/app.tsx';
import './print.css';

setPlace('desk');

const root = document.getElementById('root');
if (!root) throw new Error('The page has no place for the application.');
createRoot(root).render(
  <StrictMode>
    <App />
  </StrictMode>,
);
