import { useEffect } from 'react';
import { Outlet } from 'react-router-dom';
import { useHere } from '../../../components/field/here';
import { applyTheme } from '../../../components/field/theme';
import { PinProvider } from '../person/PinProvider';
import { WhoPage } from '../person/WhoPage';
import { LiveGuard } from '../live/LiveGuard';

/** Everything in the field happens as one person of this phone, and never past a live reading of theirs. */
export function FieldLayout() {
  const here = useHere();
  useEffect(applyTheme, []);
  if (!here) return <WhoPage />;
  return (
    <PinProvider key={here.person} here={here}>
      <LiveGuard person={here.person}>
        <Outlet />
      </LiveGuard>
    </PinProvider>
  );
}
