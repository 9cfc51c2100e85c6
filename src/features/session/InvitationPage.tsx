import { useMutation, useQuery } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { z } from 'zod';
import { invitationLook } from '../../../shared/api/people';
import { paths } from '../../app/paths';
import { request } from '../../api/request';
import { useSignOut } from '../../api/session';
import { SheetPage } from '../../components/sheet/SheetPage';
import { useWords } from '../../components/words';
import { BadLink } from './BadLink';
import { NewPasswordForm } from './NewPasswordForm';
import { SafetyPosition } from './SafetyPosition';
import { useLinkToken } from './useLinkToken';

/** Where an invited person chooses their password. */
export function InvitationPage() {
  const { t } = useWords();
  const token = useLinkToken();
  const navigate = useNavigate();
  const look = useQuery({
    queryKey: ['invitation', token],
    queryFn: () => request(invitationLook, '/api/invitations/look', { method: 'POST', body: { token } }),
    enabled: token !== '',
    retry: false,
    staleTime: Infinity,
  });
  // Somebody else may be signed in here: the invited person signs in as themselves.
  const leave = useSignOut();
  const accept = useMutation({
    mutationFn: (password: string) =>
      request(z.unknown(), '/api/invitations/accept', { method: 'POST', body: { token, password } }),
    onSuccess: () =>
      leave.mutate(undefined, { onSettled: () => void navigate(`${paths.signIn}?done=invitation`) }),
  });
  return (
    <SheetPage title={t('app.invitation.title')}>
      {(token === '' || look.error) && <BadLink error={look.error} />}
      {look.data && (
        <div className="grid items-start gap-x-12 gap-y-6 md:grid-cols-2">
          <div>
            <p>{t('app.invitation.hello', { ...look.data })}</p>
            <NewPasswordForm
              email={look.data.email}
              submitWords={t('app.invitation.join')}
              busy={accept.isPending}
              error={accept.error}
              onPassword={accept.mutate}
            />
          </div>
          <SafetyPosition />
        </div>
      )}
    </SheetPage>
  );
}
