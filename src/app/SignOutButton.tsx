import { useState } from 'react';
import { useSignOut } from '../api/session';
import { Button } from '../components/Button';
import { ButtonLink } from '../components/ButtonLink';
import { Dialog } from '../components/Dialog';
import { setHere } from '../components/field/here';
import { useWords } from '../components/words';
import { paths } from './paths';
import { unsentHere } from './unsentHere';

/** Ends the session; refused while answers on this device are not sent: they would wait for somebody who is gone. */
export function SignOutButton() {
  const { t } = useWords();
  const signOut = useSignOut();
  const [unsent, setUnsent] = useState(0);
  const [sending, setSending] = useState(false);
  // Whoever signs in next starts at their own work, and is asked for their own PIN.
  const left = () => {
    setHere(null);
    window.location.assign(paths.signIn);
  };
  async function leave() {
    const waiting = await unsentHere();
    if (waiting > 0) setUnsent(waiting);
    else signOut.mutate(undefined, { onSuccess: left });
  }
  async function send() {
    setSending(true);
    setUnsent(await unsentHere({ sendFirst: true }));
    setSending(false);
  }
  return (
    <>
      <button
        type="button"
        onClick={() => void leave()}
        disabled={signOut.isPending}
        className="min-h-11 cursor-pointer px-1 text-ink underline underline-offset-4"
      >
        {t('app.signOut')}
      </button>
      <Dialog
        open={unsent > 0}
        title={t('app.signOut.refused')}
        onClose={() => {
          setUnsent(0);
        }}
        actions={
          <>
            <ButtonLink to={paths.device}>{t('app.device')}</ButtonLink>
            <Button look="primary" disabled={sending} onClick={() => void send()}>
              {t('app.signOut.send')}
            </Button>
          </>
        }
      >
        <p className="m-0">{t('app.signOut.unsent', { n: unsent })}</p>
        <p className="m-0">{t('app.signOut.next')}</p>
      </Dialog>
    </>
  );
}
