import { ROLES, type PersonDto, type Role, type UpdatePersonRequest } from '@lampwright/contracts';
import { useState } from 'react';
import { useTranslation } from 'react-i18next';
import { closePerson, reopenPerson, updatePerson } from '../../lib/api/people';
import { useAction } from '../../lib/use-action';
import { useRevalidate } from '../../lib/use-revalidate';
import {
  Button,
  ConfirmDialog,
  ErrorState,
  Modal,
  RadioCards,
  SectionTitle,
  toast,
} from '../../ui';
import { PersonDevices } from './person-devices';

export interface ManagePersonProps {
  person: PersonDto;
  onChange: (person: PersonDto) => void;
  onClose: () => void;
}

/** Role, account and devices of one person. */
export function ManagePerson({ person, onChange, onClose }: ManagePersonProps) {
  const { t } = useTranslation(['people', 'common']);
  const revalidate = useRevalidate();
  const [asking, setAsking] = useState(false);
  const change = useAction((body: UpdatePersonRequest) => updatePerson(person.id, body));
  const toggle = useAction(() => (person.closed ? reopenPerson : closePerson)(person.id));

  const settle = (saved: PersonDto, words: string) => {
    onChange(saved);
    void revalidate('people');
    toast(words);
  };
  const setRole = async (role: Role) => {
    const outcome = await change.run({ role });
    if (outcome?.ok) settle(outcome.value, t('changed', { name: person.name }));
  };
  const setClosed = async () => {
    const outcome = await toggle.run();
    setAsking(false);
    if (!outcome?.ok) return;
    settle(
      outcome.value,
      t(outcome.value.closed ? 'closedDone' : 'reopened', { name: person.name }),
    );
  };
  const error = change.error ?? toggle.error;

  return (
    <>
      <Modal
        open={!asking}
        title={person.name}
        onClose={onClose}
        footer={
          <>
            {person.closed ? (
              <Button busy={toggle.busy} onClick={() => void setClosed()}>
                {t('reopen')}
              </Button>
            ) : (
              <Button look="danger" onClick={() => setAsking(true)}>
                {t('close')}
              </Button>
            )}
            <Button look="primary" onClick={onClose}>
              {t('done')}
            </Button>
          </>
        }
      >
        {error !== null && <ErrorState error={error} />}
        <RadioCards
          legend={t('role')}
          value={person.role}
          onChange={(role) => void setRole(role)}
          choices={ROLES.map((role) => ({
            value: role,
            label: t(`common:role.${role}`),
            disabled: change.busy || person.closed,
          }))}
        />
        <SectionTitle>{t('devices')}</SectionTitle>
        <PersonDevices personId={person.id} />
      </Modal>
      <ConfirmDialog
        open={asking}
        danger
        title={t('closeTitle', { name: person.name })}
        confirm={t('close')}
        busy={toggle.busy}
        onConfirm={() => void setClosed()}
        onClose={() => setAsking(false)}
      >
        {t('closeWords')}
      </ConfirmDialog>
    </>
  );
}
