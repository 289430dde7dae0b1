import { chakra } from '@chakra-ui/react';
import { CircleAlert } from 'lucide-react';
import { useId, type ReactNode } from 'react';
import { useTranslation } from 'react-i18next';

const Root = chakra('div', {
  base: { display: 'flex', flexDirection: 'column', gap: '1.5', minW: '0' },
});
const Label = chakra('label', { base: { fontWeight: 'semibold', fontSize: 'md' } });
const Optional = chakra('span', { base: { fontWeight: 'normal', color: 'fg.muted' } });
const Hint = chakra('p', { base: { color: 'fg.muted', fontSize: 'sm' } });
const Fault = chakra('p', {
  base: {
    color: 'ember.fg',
    fontWeight: 'medium',
    display: 'flex',
    gap: '2',
    alignItems: 'flex-start',
    '& svg': { mt: '2px', flexShrink: '0' },
  },
});

/** What ties a control to its label, its hint and its error. */
interface ControlAria {
  id: string;
  'aria-describedby'?: string;
  'aria-invalid'?: true;
}

export interface FieldProps {
  label: ReactNode;
  hint?: ReactNode;
  error?: ReactNode;
  /** Marks a field that may stay empty. */
  optional?: boolean;
  children: (aria: ControlAria) => ReactNode;
}

/** A control with its label, hint and error, tied together for those who hear the page. */
export function Field({ label, hint, error, optional = false, children }: FieldProps) {
  const { t } = useTranslation();
  const id = useId();
  const described = [hint && `${id}-hint`, error && `${id}-error`].filter(Boolean).join(' ');
  return (
    <Root>
      <Label htmlFor={id}>
        {label} {optional && <Optional>{t('optional')}</Optional>}
      </Label>
      {hint && <Hint id={`${id}-hint`}>{hint}</Hint>}
      {children({
        id,
        ...(described ? { 'aria-describedby': described } : {}),
        ...(error ? { 'aria-invalid': true } : {}),
      })}
      {error && (
        <Fault id={`${id}-error`}>
          <CircleAlert size={18} aria-hidden />
          {error}
        </Fault>
      )}
    </Root>
  );
}
