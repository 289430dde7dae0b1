import { chakra } from '@chakra-ui/react';
import type { Step } from '@lampwright/trace';
import { useTranslation } from 'react-i18next';

const ORDER: readonly Step[] = [
  'intake',
  'makeSafe',
  'confirm',
  'narrow',
  'inspect',
  'repair',
  'prove',
  'reconnect',
  'lampCheck',
  'sign',
];

const Root = chakra('div', {
  base: { display: 'flex', alignItems: 'center', gap: '3', minW: '0' },
});
const Ticks = chakra('span', {
  base: {
    display: 'inline-flex',
    gap: '3px',
    alignItems: 'center',
    '& i': { w: '10px', h: '4px', borderRadius: '2px', bg: 'line' },
    '& i[data-is=past]': { bg: 'slate.mark' },
    '& i[data-is=now]': {
      w: '14px',
      h: '12px',
      bg: 'amber.mark',
      border: '1.5px solid',
      borderColor: 'amber.edge',
    },
  },
});
const Name = chakra('span', { base: { fontWeight: 'semibold', whiteSpace: 'nowrap' } });

/** How far a trace has come: ten ticks, the present one amber, and its name. */
export function StepTrack({ step }: { step: Step }) {
  const { t } = useTranslation();
  const now = ORDER.indexOf(step);
  return (
    <Root>
      <Ticks aria-hidden>
        {ORDER.map((each, at) => (
          <i key={each} data-is={at < now ? 'past' : at === now ? 'now' : 'ahead'} />
        ))}
      </Ticks>
      <Name>{t(`step.${step}`)}</Name>
    </Root>
  );
}
