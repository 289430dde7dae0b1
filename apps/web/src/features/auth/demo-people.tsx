import { chakra } from '@chakra-ui/react';
import { useTranslation } from 'react-i18next';
import { useDemo } from '../../lib/api/demo';
import { useSession } from '../../lib/session-context';
import { useAction } from '../../lib/use-action';
import { useErrorWords } from '../../lib/use-error-words';
import { Button, Callout, SectionTitle } from '../../ui';

const Box = chakra('section', {
  base: {
    borderTop: '1px solid',
    borderColor: 'line',
    pt: '6',
    display: 'flex',
    flexDirection: 'column',
    gap: '3',
  },
});
const Words = chakra('p', { base: { color: 'fg.muted' } });
const List = chakra('div', {
  base: {
    display: 'grid',
    gap: 'touch',
    gridTemplateColumns: { base: '1fr', sm: 'repeat(2, minmax(0, 1fr))' },
  },
});
const Role = chakra('span', { base: { fontWeight: 'normal', color: 'fg.muted' } });

/** One tap signs in where the server says that the yard is a demo. */
export function DemoPeople() {
  const { t } = useTranslation(['auth', 'common']);
  const { data: demo } = useDemo();
  const { signIn } = useSession();
  const { run, busy, error } = useAction(signIn);
  const words = useErrorWords();
  if (!demo || demo.people.length === 0) return null;
  return (
    <Box>
      <SectionTitle>{t('demoTitle')}</SectionTitle>
      <Words>{t('demoWords')}</Words>
      {error !== null && (
        <Callout tone="caution" role="alert">
          {words(error)}
        </Callout>
      )}
      <List>
        {demo.people.map(({ name, email, role }) => (
          <Button
            key={email}
            disabled={busy}
            aria-label={t('demoAs', { name, role: t(`common:role.${role}`) })}
            onClick={() => void run({ email, password: demo.password })}
          >
            <span>
              {name} <Role>{t(`common:role.${role}`)}</Role>
            </span>
          </Button>
        ))}
      </List>
    </Box>
  );
}
