import '@fontsource-variable/source-sans-3/index.css';
import { StrictMode, startTransition } from 'react';
import { createRoot } from 'react-dom/client';
import { restoreSession } from './api/restore-session';
import { Application } from './application';

const root = document.getElementById('root');
if (root === null) throw new Error('index.html lacks the element with id "root".');

void restoreSession();
// In slices, so that the browser can paint and answer between them.
startTransition(() =>
  createRoot(root).render(
    <StrictMode>
      <Application />
    </StrictMode>,
  ),
);
