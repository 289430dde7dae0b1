import { chakra } from '@chakra-ui/react';
import { ROLES, type CreatePersonRequest } from '@lampwright/contracts';
import { useEffect, useId } from 'react';
import { useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { createPerson } from '../../lib/api/people';
import { useAction } from '../../lib/use-action';
import { useFieldErrors } from '../../lib/use-field-errors';
import { useFormDraft } from '../../lib/use-form-draft';
import { useRevalidate } from '../../lib/use-revalidate';
import { Button, DraftNote, ErrorState, Modal, Select, TextInput, toast } from '../../ui';

const SECRET = ['password'] as const;
const BLANK: CreatePersonRequest = { name: '', email: '', role: 'technician', password: '' };
const Form = chakra('form', { base: { display: 'flex', flexDirection: 'column', gap: '5' } });

export function AddPerson({ onClose }: { onClose: () => void }) {
  const { t } = useTranslation(['people', 'common']);
  const formId = useId();
  const revalidate = useRevalidate();
  const { run, busy, error } = useAction(createPerson);
  const form = useForm<CreatePersonRequest>({ defaultValues: BLANK });
  const draft = useFormDraft('person:new', form, SECRET);
  const placeErrors = useFieldErrors();
  const { errors } = form.formState;

  useEffect(() => {
    if (error !== null) placeErrors(error, form);
  }, [error, form, placeErrors]);

  const submit = form.handleSubmit(async (values) => {
    const outcome = await run({ ...values, name: values.name.trim(), email: values.email.trim() });
    if (!outcome?.ok) return;
    draft.clear();
    void revalidate('people');
    toast(t('created', { name: outcome.value.name }));
    onClose();
  });
  const afresh = () => {
    form.reset(BLANK);
    draft.clear();
  };

  return (
    <Modal
      open
      title={t('newTitle')}
      onClose={onClose}
      footer={
        <>
          <Button onClick={onClose}>{t('common:cancel')}</Button>
          <Button type="submit" form={formId} look="primary" busy={busy}>
            {t('create')}
          </Button>
        </>
      }
    >
      <Form id={formId} noValidate onSubmit={(event) => void submit(event)}>
        <DraftNote draft={draft} onAfresh={afresh} />
        <TextInput
          label={t('name')}
          error={errors.name?.message}
          {...form.register('name', { validate: (text) => text.trim() !== '' || t('need.name') })}
        />
        <TextInput
          label={t('email')}
          type="email"
          error={errors.email?.message}
          {...form.register('email', {
            pattern: { value: /^\s*\S+@\S+\s*$/, message: t('need.email') },
            required: t('need.email'),
          })}
        />
        <Select
          label={t('role')}
          options={ROLES.map((role) => ({ value: role, label: t(`common:role.${role}`) }))}
          {...form.register('role')}
        />
        <TextInput
          label={t('password')}
          hint={t('passwordHint')}
          type="password"
          autoComplete="new-password"
          error={errors.password?.message}
          {...form.register('password', {
            required: t('need.password'),
            minLength: { value: 10, message: t('need.password') },
          })}
        />
        {error !== null && <ErrorState error={error} />}
      </Form>
    </Modal>
  );
}
