import { Outlet, ScrollRestoration } from 'react-router-dom';
import { WordsProvider } from '../components/words';

export function Root() {
  return (
    <WordsProvider>
      <Outlet />
      <ScrollRestoration />
    </WordsProvider>
  );
}
