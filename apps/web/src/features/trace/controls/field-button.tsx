import { Button, type ButtonProps } from '../../../ui/button';
import { useGuardedTap } from './tap-guard';

interface FieldButtonProps extends Omit<ButtonProps, 'onClick' | 'aria-label' | 'aria-pressed'> {
  pressed?: boolean;
  /** A name that says more than the label, for where the label alone is not enough. */
  name?: string;
  onTap: () => void;
}

/** Any other action on a field screen, with the guard against double taps. */
export function FieldButton({ pressed, name, onTap, ...rest }: FieldButtonProps) {
  const tap = useGuardedTap(onTap);
  return <Button aria-pressed={pressed} aria-label={name} onClick={tap} px="4" {...rest} />;
}

/** The one way on from this screen. */
export function GoOnButton(props: Omit<FieldButtonProps, 'look' | 'size'>) {
  return <FieldButton look="primary" size="answer" justifyContent="center" {...props} />;
}
