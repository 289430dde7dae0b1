import { chakra } from '@chakra-ui/react';
import { Eye, EyeOff } from 'lucide-react';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { useSession } from '../../lib/session-context';
import { useAction } from '../../lib/use-action';
import { useErrorWords } from '../../lib/use-error-words';
import { useFormDraft } from '../../lib/use-form-draft';
import { Button, Callout, TextInput } from '../../ui';

interface SignInValues {
  email: string;
  password: string;
  deviceName: string;
}

const SECRET = ['password'] as const;
const Form = chakra('form', { base: { display: 'flex', flexDirection: 'column', gap: '5' } });

export function SignInForm() {
  const { t } = useTranslation('auth');
  const { signIn } = useSession();
  const { run, busy, error } = useAction(signIn);
  const words = useErrorWords();
  const [shown, setShown] = useState(false);
  const form = useForm<SignInValues>({
    defaultValues: { email: '', password: '', deviceName: '' },
  });
  // The e-mail and the device's name stay for the next time; the password never does.
  useFormDraft('sign-in', form, SECRET);
  const { errors } = form.formState;

  const submit = form.handleSubmit(async ({ email, password, deviceName }) => {
    const name = deviceName.trim();
    await run({ email: email.trim(), password, ...(name ? { deviceName: name } : {}) });
  });

  return (
    <Form noValidate onSubmit={(event) => void submit(event)}>
      {error !== null && (
        <Callout tone="caution" role="alert">
          {words(error)}
        </Callout>
      )}
      <TextInput
        label={t('email')}
        type="email"
        inputMode="email"
        autoComplete="username"
        autoCapitalize="none"
        error={errors.email?.message}
        {...form.register('email', { required: t('emailMissing') })}
      />
      <TextInput
        label={t('password')}
        type={shown ? 'text' : 'password'}
        autoComplete="current-password"
        error={errors.password?.message}
        {...form.register('password', { required: t('passwordMissing') })}
      />
      <div>
        <Button
          size="office"
          look="quiet"
          icon={shown ? EyeOff : Eye}
          onClick={() => setShown(!shown)}
        >
          {t(shown ? 'hidePassword' : 'showPassword')}
        </Button>
      </div>
      <TextInput
        label={t('device')}
        hint={t('deviceHint')}
        optional
        {...form.register('deviceName')}
      />
      <Button type="submit" look="primary" wide busy={busy}>
        {t('signIn')}
      </Button>
    </Form>
  );
}
