import { system } from '../theme/system';
import type { PaletteName } from '../theme/palette';

const token = (name: PaletteName): string => system.token.var(`colors.${name}`);

/** The colours of the drawing, by what they say; light and dark are settled in the theme. */
export const colours = {
  paper: token('bg.canvas'),
  sheet: token('bg.panel'),
  sunken: token('bg.sunken'),
  ink: token('fg'),
  muted: token('fg.muted'),
  line: token('line'),
  edge: token('edge'),
  flag: token('ink.solid'),
  onFlag: token('ink.onSolid'),
  amber: token('amber.mark'),
  amberEdge: token('amber.edge'),
  amberWash: token('amber.wash'),
  onAmber: token('amber.onMark'),
  amberText: token('amber.fg'),
  slate: token('slate.mark'),
  slateWash: token('slate.wash'),
  slateText: token('slate.fg'),
  ember: token('ember.mark'),
  emberText: token('ember.fg'),
  emberWash: token('ember.wash'),
  pine: token('pine.mark'),
  focus: token('focus'),
} as const;
