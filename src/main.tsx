import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { RouterProvider } from 'react-router-dom';
import { router } from './app/router';
import { applyTheme } from './components/field/theme';
import './components/tokens.css';

applyTheme();

const root = document.getElementById('root');
if (!root) throw new Error('index.html has no element with id "root"');
createRoot(root).render(
  <StrictMode>
    <RouterProvider router={router} />
  </StrictMode>,
);
