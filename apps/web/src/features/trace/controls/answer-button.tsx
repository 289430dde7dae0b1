import { Check, Zap } from 'lucide-react';
import { Answer } from '../../../ui';
import type { ButtonProps } from '../../../ui/button';
import { useGuardedTap } from './tap-guard';

type AnswerTone = 'overload' | 'holds' | 'plain';

interface AnswerButtonProps {
  tone: AnswerTone;
  label: string;
  /** What the answer would mean. */
  about?: string;
  disabled?: boolean;
  /** In place of the sign of the tone. */
  icon?: ButtonProps['icon'];
  onTap: () => void;
}

const looks = {
  overload: { look: 'overload', icon: Zap },
  holds: { look: 'holds', icon: Check },
  plain: { look: 'secondary' },
} as const;

/** One answer to the question on the screen: colour, sign and words each say it alone. */
export function AnswerButton({
  tone,
  label,
  about,
  disabled = false,
  icon,
  onTap,
}: AnswerButtonProps) {
  const tap = useGuardedTap(onTap);
  return (
    <Answer
      {...looks[tone]}
      {...(icon ? { icon } : {})}
      hint={about}
      disabled={disabled}
      onClick={tap}
    >
      {label}
    </Answer>
  );
}
