import { useMutation } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { z } from 'zod';
import { paths } from '../../app/paths';
import { request } from '../../api/request';
import { SheetPage } from '../../components/sheet/SheetPage';
import { useWords } from '../../components/words';
import { AskResetForm } from './AskResetForm';
import { NewPasswordForm } from './NewPasswordForm';
import { useLinkToken } from './useLinkToken';

/** Without a link: asks for one. With the mailed link: sets the new password. */
export function PasswordResetPage() {
  const { t } = useWords();
  const token = useLinkToken();
  const navigate = useNavigate();
  const use = useMutation({
    mutationFn: (password: string) =>
      request(z.unknown(), '/api/password-resets/use', { method: 'POST', body: { token, password } }),
    onSuccess: () => navigate(`${paths.signIn}?done=password`),
  });
  return (
    <SheetPage title={t('app.reset.title')}>
      {token === '' ? (
        <AskResetForm />
      ) : (
        <NewPasswordForm
          submitWords={t('app.reset.use')}
          busy={use.isPending}
          error={use.error}
          onPassword={use.mutate}
        />
      )}
    </SheetPage>
  );
}
