import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { z } from 'zod';
import { Button } from '../../components/Button';
import { TextField } from '../../components/form/TextField';
import { useErrorWords } from '../../components/form/useErrorWords';
import { ProblemMessage } from '../../components/ProblemMessage';
import { useWords } from '../../components/words';

// The length is the contract's (`newPassword` of shared/api/people); its words are ours.
const newPasswordForm = z
  .object({ password: z.string().min(15, 'app.password.short').max(200), again: z.string() })
  .refine((values) => values.password === values.again, { path: ['again'], error: 'app.password.differs' });

interface NewPasswordFormProps {
  /** Told to password managers, so that they keep the password under the right name. */
  email?: string;
  submitWords: string;
  busy: boolean;
  error: unknown;
  onPassword: (password: string) => void;
}

/** A new password, typed twice. */
export function NewPasswordForm({ email, submitWords, busy, error, onPassword }: NewPasswordFormProps) {
  const { t } = useWords();
  const errorWords = useErrorWords();
  const form = useForm({
    resolver: zodResolver(newPasswordForm),
    defaultValues: { password: '', again: '' },
  });
  const { errors } = form.formState;
  return (
    <form noValidate onSubmit={form.handleSubmit((values) => onPassword(values.password))}>
      {email && <input type="hidden" name="username" autoComplete="username" value={email} readOnly />}
      <TextField
        label={t('app.signIn.password')}
        hint={t('app.password.hint')}
        type="password"
        autoComplete="new-password"
        error={errorWords(errors.password)}
        {...form.register('password')}
      />
      <TextField
        label={t('app.password.repeat')}
        type="password"
        autoComplete="new-password"
        error={errorWords(errors.again)}
        {...form.register('again')}
      />
      <ProblemMessage error={error} />
      <Button type="submit" look="primary" busy={busy}>
        {submitWords}
      </Button>
    </form>
  );
}
