import { chakra } from '@chakra-ui/react';
import { Check } from 'lucide-react';
import { useGuardedTap } from './tap-guard';

interface ChoiceCardProps {
  label: string;
  about?: string;
  /** A word that sets this choice apart, as "Recommended". */
  badge?: string;
  chosen: boolean;
  /** One of several that exclude each other: a round mark in place of the box. */
  single?: boolean;
  onTap: () => void;
}

const Card = chakra('button', {
  base: {
    display: 'flex',
    alignItems: 'center',
    gap: '4',
    width: 'full',
    minHeight: 'answer',
    paddingX: '4',
    paddingY: '2.5',
    borderRadius: 'lg',
    borderWidth: '2px',
    borderColor: 'edge',
    bg: 'bg.panel',
    color: 'fg',
    fontSize: 'lg',
    fontWeight: 'semibold',
    lineHeight: '1.2',
    textAlign: 'start',
    cursor: 'pointer',
    _active: { bg: 'bg.sunken' },
    _pressed: { borderColor: 'fg', borderWidth: '3px', bg: 'amber.wash' },
  },
});

const Box = chakra('span', {
  base: {
    flexShrink: 0,
    display: 'grid',
    placeItems: 'center',
    width: '30px',
    height: '30px',
    borderRadius: 'sm',
    borderWidth: '2px',
    borderColor: 'edge',
    bg: 'bg.panel',
  },
  variants: {
    single: { true: { borderRadius: 'full' } },
    chosen: { true: { bg: 'ink.solid', borderColor: 'ink.solid', color: 'ink.onSolid' } },
  },
});

const About = chakra('span', {
  base: {
    display: 'block',
    fontSize: 'sm',
    fontWeight: 'normal',
    color: 'fg.muted',
    marginTop: '0.5',
  },
});

const Badge = chakra('span', {
  base: {
    marginInlineStart: '2',
    paddingX: '2',
    borderRadius: 'full',
    bg: 'pine.wash',
    color: 'pine.fg',
    fontSize: 'sm',
    fontWeight: 'semibold',
    whiteSpace: 'nowrap',
  },
});

/** Something to choose, alone or with others: a box with a tick, a heavier edge and a wash say that it is chosen. */
export function ChoiceCard({
  label,
  about,
  badge,
  chosen,
  single = false,
  onTap,
}: ChoiceCardProps) {
  const tap = useGuardedTap(onTap);
  return (
    <Card type="button" aria-pressed={chosen} onClick={tap}>
      <Box chosen={chosen} single={single}>
        {chosen && <Check aria-hidden size={22} strokeWidth={3.5} />}
      </Box>
      <span>
        {label}
        {badge && <Badge>{badge}</Badge>}
        {about && <About>{about}</About>}
      </span>
    </Card>
  );
}
