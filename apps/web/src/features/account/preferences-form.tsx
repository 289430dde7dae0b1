import { Monitor, Moon, Sun } from 'lucide-react';
import type { Preferences } from '@lampwright/contracts';
import { useTranslation } from 'react-i18next';
import { updateAccount } from '../../lib/api/account';
import { useAccount, useSession } from '../../lib/session-context';
import { useAction } from '../../lib/use-action';
import { ErrorState, RadioCards } from '../../ui';

/** Each choice is kept as soon as it is made. */
export function PreferencesForm() {
  const { t } = useTranslation('account');
  const { preferences } = useAccount();
  const { replace } = useSession();
  const { run, error } = useAction(updateAccount);
  const choose = async (change: Partial<Preferences>) => {
    const outcome = await run({ preferences: change });
    if (outcome?.ok) replace(outcome.value);
  };
  return (
    <>
      <RadioCards
        legend={t('lengths')}
        columns={2}
        value={preferences.lengths}
        onChange={(lengths) => void choose({ lengths })}
        choices={[
          { value: 'feet', label: t('feet') },
          { value: 'metres', label: t('metres') },
        ]}
      />
      <RadioCards
        legend={t('theme')}
        value={preferences.theme}
        onChange={(theme) => void choose({ theme })}
        choices={[
          { value: 'light', label: t('light'), hint: t('lightHint'), icon: Sun },
          { value: 'dark', label: t('dark'), hint: t('darkHint'), icon: Moon },
          { value: 'system', label: t('system'), icon: Monitor },
        ]}
      />
      {error !== null && <ErrorState error={error} />}
    </>
  );
}
