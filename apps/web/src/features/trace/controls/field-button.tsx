import { Check } from 'lucide-react';
import { Button } from '../../../ui';
import type { ButtonProps } from '../../../ui/button';
import { useGuardedTap } from './tap-guard';

interface FieldButtonProps extends Omit<ButtonProps, 'onClick' | 'aria-label' | 'aria-pressed'> {
  /** For one of several to choose from; a tick and a dark ground say that it is chosen. */
  pressed?: boolean;
  /** A name that says more than the label, for where the label alone is not enough. */
  name?: string;
  onTap: () => void;
}

/** Any other action on a field screen, with the guard against double taps. */
export function FieldButton({ pressed, name, onTap, ...rest }: FieldButtonProps) {
  const tap = useGuardedTap(onTap);
  return (
    <Button
      aria-pressed={pressed}
      aria-label={name}
      onClick={tap}
      px="3.5"
      fontSize="md"
      {...(pressed ? { look: 'primary', icon: Check } : {})}
      {...rest}
    />
  );
}

/** The one way on from this screen. */
export function GoOnButton(props: Omit<FieldButtonProps, 'look' | 'size'>) {
  return (
    <FieldButton look="primary" size="answer" justifyContent="center" fontSize="xl" {...props} />
  );
}

/** The way back, as large as the way on beside it. */
export function GoBackButton(props: Omit<FieldButtonProps, 'look' | 'size'>) {
  return <FieldButton size="answer" justifyContent="center" fontSize="xl" {...props} />;
}
