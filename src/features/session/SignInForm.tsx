import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { Link } from 'react-router-dom';
import { z } from 'zod';
import { paths } from '../../app/paths';
import { useSignIn } from '../../api/session';
import { Button } from '../../components/Button';
import { leaveUnless } from '../../components/field/here';
import { TextField } from '../../components/form/TextField';
import { useErrorWords } from '../../components/form/useErrorWords';
import { ProblemMessage } from '../../components/ProblemMessage';
import { problemIn } from '../../components/problemWords';
import { useWords } from '../../components/words';

const signInForm = z.object({
  email: z.email('app.email.wrong').max(200),
  password: z.string().min(1, 'app.required').max(200),
});

/** E-mail and password. `done` names what was just finished (`password`, `invitation`), so that the page can say so. */
export function SignInForm({ done }: { done: string | null }) {
  const { t } = useWords();
  const errorWords = useErrorWords();
  const signIn = useSignIn();
  const form = useForm({
    resolver: zodResolver(signInForm),
    defaultValues: { email: '', password: '' },
  });
  const { errors } = form.formState;
  return (
    <form
      noValidate
      onSubmit={form.handleSubmit((values) =>
        signIn.mutate(values, { onSuccess: ({ person }) => leaveUnless(person.id) }),
      )}
    >
      {done === 'password' && <p role="status">{t('app.reset.done')}</p>}
      {done === 'invitation' && <p role="status">{t('app.invitation.done')}</p>}
      <TextField
        label={t('app.signIn.email')}
        type="email"
        autoComplete="username"
        error={errorWords(errors.email)}
        {...form.register('email')}
      />
      <TextField
        label={t('app.signIn.password')}
        type="password"
        autoComplete="current-password"
        error={errorWords(errors.password)}
        {...form.register('password')}
      />
      {/* A wrong password says by itself what to do: nobody is to sign in again first. */}
      <ProblemMessage
        error={signIn.error}
        kept=""
        {...(problemIn(signIn.error)?.status === 401 ? { next: '' } : {})}
      />
      <Button type="submit" look="primary" busy={signIn.isPending} className="min-w-40">
        {t('app.signIn')}
      </Button>
      <p className="mt-6 flex flex-col items-start gap-2">
        <Link to={paths.passwordReset}>{t('app.signIn.forgot')}</Link>
        <Link to={paths.verify}>{t('app.signIn.verify')}</Link>
      </p>
    </form>
  );
}
