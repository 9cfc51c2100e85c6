/** Mounts the field screens over the memory store. Development and tests only; nothing of the app imports it. */
import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { createRoot } from 'react-dom/client';
import { createBrowserRouter, RouterProvider } from 'react-router-dom';
import './harness.css';
import { WordsProvider } from '../../../src/components/words';
import { deviceRoutes } from '../../../src/features/device/routes';
import { fieldRoutes } from '../../../src/features/fieldwork/routes';
import { DeviceProvider } from '../../../src/offline/useDevice';
import { MemoryStore } from './MemoryStore';
import { electrician, foreman, samplePack } from './samplePack';
import { smallPack } from './smallPack';

// localStorage.setItem('harness.pack', 'small') shows the generator's own steps.
const pack = localStorage.getItem('harness.pack') === 'small' ? smallPack() : samplePack;
const store = new MemoryStore(pack, [electrician, foreman]);
Object.assign(window, { harness: store });
const router = createBrowserRouter([...fieldRoutes, ...deviceRoutes]);

const root = document.getElementById('root');
if (!root) throw new Error('the page has no root');
createRoot(root).render(
  <QueryClientProvider client={new QueryClient({ defaultOptions: { queries: { retry: false } } })}>
    <WordsProvider>
      <DeviceProvider store={store}>
        <RouterProvider router={router} />
      </DeviceProvider>
    </WordsProvider>
  </QueryClientProvider>,
);
