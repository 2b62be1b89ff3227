/** The page's first script: faces, colours, then the shell. */

import '@fontsource/b612/latin-400.css';
import '@fontsource/b612/latin-700.css';
import '@fontsource/b612-mono/latin-400.css';
import '@fontsource/stix-two-text/greek-400.css';
import '@fontsource/stix-two-text/greek-400-italic.css';
import '@fontsource/stix-two-text/latin-400.css';
import '@fontsource/stix-two-text/latin-400-italic.css';
import './theme/tokens.css';
import './theme/controls.css';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { registerOffline } from './offline/new-version.ts';
import { App } from './shell/App.tsx';
import { begin } from './shell/begin.ts';

const root = document.getElementById('root');
if (root === null) throw new Error('the page has no root element');
begin().then(() =>
  createRoot(root).render(
    <StrictMode>
      <App />
    </StrictMode>,
  ),
);
registerOffline();
