import { chakra } from '@chakra-ui/react';
import { useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { updateAccount } from '../../lib/api/account';
import { useAccount, useSession } from '../../lib/session-context';
import { useAction } from '../../lib/use-action';
import { useFormDraft } from '../../lib/use-form-draft';
import { Button, ErrorState, Facts, TextInput, toast } from '../../ui';

const Form = chakra('form', { base: { display: 'flex', flexDirection: 'column', gap: '5' } });

export function NameForm() {
  const { t } = useTranslation(['account', 'common']);
  const account = useAccount();
  const { replace } = useSession();
  const { run, busy, error } = useAction(updateAccount);
  const form = useForm({ defaultValues: { name: account.name } });
  const draft = useFormDraft(`account:${account.id}`, form);

  const submit = form.handleSubmit(async ({ name }) => {
    const outcome = await run({ name: name.trim() });
    if (!outcome?.ok) return;
    draft.clear();
    replace(outcome.value);
    toast(t('kept'));
  });
  return (
    <Form noValidate onSubmit={(event) => void submit(event)}>
      <Facts
        facts={[
          [t('email'), account.email],
          [t('role'), t(`common:role.${account.role}`)],
        ]}
      />
      <TextInput
        label={t('name')}
        hint={t('signedAs')}
        autoComplete="name"
        error={form.formState.errors.name?.message}
        {...form.register('name', { validate: (text) => text.trim() !== '' || t('nameMissing') })}
      />
      {error !== null && <ErrorState error={error} />}
      <div>
        <Button type="submit" busy={busy}>
          {t('common:save')}
        </Button>
      </div>
    </Form>
  );
}
