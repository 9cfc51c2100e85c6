import { zodResolver } from '@hookform/resolvers/zod';
import { useMutation } from '@tanstack/react-query';
import { useForm } from 'react-hook-form';
import { z } from 'zod';
import { request } from '../../api/request';
import { Button } from '../../components/Button';
import { TextField } from '../../components/form/TextField';
import { useErrorWords } from '../../components/form/useErrorWords';
import { ProblemMessage } from '../../components/ProblemMessage';
import { useWords } from '../../components/words';

const askForm = z.object({ email: z.email('app.email.wrong').max(200) });

/** Asks for a reset link. The answer is the same whether the address is known or not. */
export function AskResetForm() {
  const { t } = useWords();
  const errorWords = useErrorWords();
  const form = useForm({ resolver: zodResolver(askForm), defaultValues: { email: '' } });
  const ask = useMutation({
    mutationFn: (body: { email: string }) =>
      request(z.unknown(), '/api/password-resets', { method: 'POST', body }),
  });
  if (ask.isSuccess) return <p role="status">{t('app.reset.sent')}</p>;
  return (
    <form noValidate onSubmit={form.handleSubmit((values) => ask.mutate(values))}>
      <p className="max-w-[66ch]">{t('app.reset.ask')}</p>
      <TextField
        label={t('app.signIn.email')}
        type="email"
        autoComplete="username"
        error={errorWords(form.formState.errors.email)}
        {...form.register('email')}
      />
      <ProblemMessage error={ask.error} />
      <Button type="submit" look="primary" busy={ask.isPending}>
        {t('app.reset.send')}
      </Button>
    </form>
  );
}
