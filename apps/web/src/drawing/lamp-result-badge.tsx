import type { LampResult } from '@lampwright/trace';
import { colours } from './drawing-colours';

interface Look {
  /** Drawn in a square from -1 to 1. */
  ground: string;
  sign: string;
  fill: string;
}

/** A shape of its own for every result, so that colour only repeats it. */
const looks: Record<LampResult, Look> = {
  lit: {
    ground: 'M-1 0a1 1 0 1 0 2 0a1 1 0 1 0 -2 0z',
    sign: 'M-.5 0l.35 .4l.65 -.75',
    fill: colours.pine,
  },
  dark: {
    ground: 'M-.9 -.9h1.8v1.8h-1.8z',
    sign: 'M-.45 -.45l.9 .9M.45 -.45l-.9 .9',
    fill: colours.ember,
  },
  dim: { ground: 'M0 -1.1L1.1 .9H-1.1z', sign: 'M0 -.4v.55M0 .45v.15', fill: colours.amberEdge },
  wrongCircuit: {
    ground: 'M0 -1.15L1.15 0L0 1.15L-1.15 0z',
    sign: 'M-.55 -.2h1M.2 -.45l.25 .25M.55 .25h-1M-.2 .5l-.25 -.25',
    fill: colours.ember,
  },
};

/** What the lamp check found, at the upper right of a lamp. */
export function LampResultBadge({ result, size }: { result: LampResult; size: number }) {
  const look = looks[result];
  const r = Math.max(5, size * 0.36);
  return (
    <g transform={`translate(${size * 0.48} ${-size * 0.48}) scale(${r})`} data-result={result}>
      <path d={look.ground} fill={look.fill} stroke={colours.sheet} strokeWidth={0.22} />
      <path
        d={look.sign}
        fill="none"
        stroke={colours.sheet}
        strokeWidth={0.3}
        strokeLinecap="round"
        strokeLinejoin="round"
      />
    </g>
  );
}
