import { chakra } from '@chakra-ui/react';

const Art = chakra('svg', {
  base: {
    w: 'full',
    maxW: '640px',
    h: 'auto',
    display: { base: 'none', lg: 'block' },
    fill: 'none',
    '& .body': { fill: 'bg.panel', stroke: 'fg', strokeWidth: '2' },
    '& .cleared': { stroke: 'slate.mark', strokeWidth: '2.5' },
    '& .suspect': { stroke: 'amber.mark', strokeWidth: '6', strokeLinejoin: 'round' },
    '& .cut': { stroke: 'amber.mark', strokeWidth: '4', strokeDasharray: '12 7' },
    '& .lamp': { fill: 'bg.panel', stroke: 'slate.mark', strokeWidth: '2.5' },
    '& .hot': { fill: 'amber.mark', stroke: 'amber.edge', strokeWidth: '2' },
    '& .inlet': { fill: 'fg' },
  },
});

/** The program in one picture: a trailer from above, its harness, and the cut. */
export function HarnessArt() {
  return (
    <Art viewBox="0 0 640 210" aria-hidden="true">
      <path className="body" d="M22 30h598q8 0 8 8v134q0 8-8 8H22q-10-75 0-150z" />
      <path className="cleared" d="M14 105H394M62 105V46M62 105v61M300 105V46M300 105v61" />
      <path className="suspect" d="M430 105h120M550 105V52h56M550 105v53h56M550 105h56" />
      <rect className="inlet" x="6" y="94" width="20" height="22" rx="4" />
      <g className="lamp">
        <circle cx="62" cy="44" r="8" />
        <circle cx="62" cy="166" r="8" />
        <circle cx="300" cy="44" r="8" />
        <circle cx="300" cy="166" r="8" />
      </g>
      <g className="hot">
        <rect x="598" y="42" width="20" height="20" rx="5" />
        <rect x="598" y="148" width="20" height="20" rx="5" />
        <circle cx="608" cy="105" r="8" />
      </g>
      <path className="cut" d="M410 6v198" />
    </Art>
  );
}
