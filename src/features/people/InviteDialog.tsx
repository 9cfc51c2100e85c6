import { zodResolver } from '@hookform/resolvers/zod';
import { useId, useState } from 'react';
import { useForm } from 'react-hook-form';
import { v7 as uuid } from 'uuid';
import { z } from 'zod';
import { useInvite } from '../../api/people';
import { Button } from '../../components/Button';
import { Dialog } from '../../components/Dialog';
import { SelectField } from '../../components/form/SelectField';
import { setFieldErrors } from '../../components/form/setFieldErrors';
import { TextField } from '../../components/form/TextField';
import { useErrorWords } from '../../components/form/useErrorWords';
import { ProblemMessage } from '../../components/ProblemMessage';
import { useWords } from '../../components/words';
import { RolesField, type SiteRole } from './RolesField';
import { oneLine } from '../../components/field/oneLine';

const inviteForm = z.object({
  name: z.string().transform(oneLine).pipe(z.string().min(1, 'app.required').max(120)),
  email: z.email('app.email.wrong').max(200),
  language: z.enum(['en', 'es']),
});

/** A new person: name, e-mail, language, roles. They get a mail and choose their own password. */
export function InviteDialog({ onClose }: { onClose: () => void }) {
  const { t, language } = useWords();
  const errorWords = useErrorWords();
  const invite = useInvite();
  const formId = useId();
  const [id] = useState(() => uuid());
  const [roles, setRoles] = useState<SiteRole[]>([]);
  const form = useForm({
    resolver: zodResolver(inviteForm),
    defaultValues: { name: '', email: '', language },
  });
  const { errors, isSubmitted } = form.formState;
  const send = form.handleSubmit((values) => {
    if (roles.length === 0) return;
    invite.mutate(
      { id, roles, ...values },
      { onSuccess: onClose, onError: (error) => setFieldErrors(form, error) },
    );
  });
  return (
    <Dialog
      open
      title={t('office.people.invite')}
      onClose={onClose}
      closeWords={t('app.cancel')}
      actions={
        <Button type="submit" form={formId} look="primary" busy={invite.isPending}>
          {t('office.people.sendInvitation')}
        </Button>
      }
    >
      <p className="m-0">{t('office.people.invite.note')}</p>
      <form id={formId} noValidate onSubmit={send}>
        <TextField
          label={t('office.people.name')}
          autoComplete="off"
          error={errorWords(errors.name)}
          {...form.register('name')}
        />
        <TextField
          label={t('app.signIn.email')}
          type="email"
          autoComplete="off"
          error={errorWords(errors.email)}
          {...form.register('email')}
        />
        <SelectField
          label={t('office.people.language')}
          options={[
            { value: 'en', label: 'English' },
            { value: 'es', label: 'Español' },
          ]}
          {...form.register('language')}
        />
        <RolesField
          roles={roles}
          onChange={setRoles}
          error={isSubmitted && roles.length === 0 ? t('office.people.roles.needed') : undefined}
        />
      </form>
      <ProblemMessage error={invite.error} />
    </Dialog>
  );
}
