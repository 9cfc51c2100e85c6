import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { RouterProvider } from 'react-router-dom';
import { watchForGoneChunks } from './app/chunkGone';
import { router } from './app/router';
import { applyTheme } from './components/field/theme';
import './components/tokens.css';

applyTheme();
watchForGoneChunks();

const root = document.getElementById('root');
if (!root) throw new Error('index.html has no element with id "root"');
createRoot(root).render(
  <StrictMode>
    <RouterProvider router={router} />
  </StrictMode>,
);
// After the first page is drawn: nothing on it waits for sending.
void import('./app/startDevice');
