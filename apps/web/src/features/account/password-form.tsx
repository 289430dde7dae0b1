import { chakra } from '@chakra-ui/react';
import type { ChangePasswordRequest } from '@lampwright/contracts';
import { useEffect } from 'react';
import { useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { changePassword } from '../../lib/api/account';
import { useAction } from '../../lib/use-action';
import { useFieldErrors } from '../../lib/use-field-errors';
import { useRevalidate } from '../../lib/use-revalidate';
import { Button, ErrorState, TextInput, toast } from '../../ui';

const Form = chakra('form', { base: { display: 'flex', flexDirection: 'column', gap: '5' } });

export function PasswordForm() {
  const { t } = useTranslation('account');
  const revalidate = useRevalidate();
  const { run, busy, error } = useAction(changePassword);
  const form = useForm<ChangePasswordRequest>({ defaultValues: { current: '', next: '' } });
  const placeErrors = useFieldErrors();
  const { errors } = form.formState;

  useEffect(() => {
    if (error !== null) placeErrors(error, form);
  }, [error, form, placeErrors]);

  const submit = form.handleSubmit(async (values) => {
    const outcome = await run(values);
    if (!outcome?.ok) return;
    form.reset();
    void revalidate('account');
    toast(t('passwordChanged'));
  });
  return (
    <Form noValidate onSubmit={(event) => void submit(event)}>
      <TextInput
        label={t('current')}
        type="password"
        autoComplete="current-password"
        error={errors.current?.message}
        {...form.register('current', { required: t('currentMissing') })}
      />
      <TextInput
        label={t('next')}
        hint={t('nextHint')}
        type="password"
        autoComplete="new-password"
        error={errors.next?.message}
        {...form.register('next', {
          required: t('nextShort'),
          minLength: { value: 10, message: t('nextShort') },
        })}
      />
      {error !== null && <ErrorState error={error} />}
      <div>
        <Button type="submit" busy={busy}>
          {t('changePassword')}
        </Button>
      </div>
    </Form>
  );
}
