/** A colour in daylight and in a night bay. */
interface Shade {
  light: string;
  dark: string;
}

/**
 * Every colour of the program, by what it is for. Text and what it stands on keep 7:1 and marks keep 3:1 in both
 * themes; `palette.test.ts` computes it.
 */
export const palette = {
  // Grounds
  'bg.canvas': { light: '#FAF7F1', dark: '#0D161D' },
  'bg.panel': { light: '#FFFFFF', dark: '#14212B' },
  'bg.sunken': { light: '#F3EEE4', dark: '#1C2C38' },
  // Text
  fg: { light: '#14212B', dark: '#FAF7F1' },
  'fg.muted': { light: '#41505B', dark: '#B9C5CD' },
  // Lines: `line` only divides, `edge` is the border of something that can be used
  line: { light: '#DDD6C8', dark: '#31434F' },
  edge: { light: '#71838F', dark: '#7A8C99' },
  // The plain strong action
  'ink.solid': { light: '#14212B', dark: '#FAF7F1' },
  'ink.pressed': { light: '#2B3D4A', dark: '#D9D3C6' },
  'ink.onSolid': { light: '#FAF7F1', dark: '#14212B' },
  // In question, and next
  'amber.mark': { light: '#E8950C', dark: '#F0A52A' },
  'amber.edge': { light: '#B86F00', dark: '#F0A52A' },
  'amber.wash': { light: '#FDF0D9', dark: '#3A2A0E' },
  'amber.fg': { light: '#6B4000', dark: '#FFC46B' },
  'amber.onMark': { light: '#0D161D', dark: '#0D161D' },
  // Cleared
  'slate.mark': { light: '#7A8C99', dark: '#8FA1AE' },
  'slate.wash': { light: '#EDF1F3', dark: '#22333F' },
  'slate.fg': { light: '#3F4E59', dark: '#C3CED5' },
  // Overload and danger
  'ember.mark': { light: '#B3361E', dark: '#E06A50' },
  'ember.solid': { light: '#98290F', dark: '#8F2713' },
  'ember.pressed': { light: '#7A1F0B', dark: '#7A1F0B' },
  'ember.wash': { light: '#FBEFEC', dark: '#3B1A13' },
  'ember.fg': { light: '#8F2713', dark: '#FFB9A8' },
  'ember.onSolid': { light: '#FFFFFF', dark: '#FFFFFF' },
  // Holds and done
  'pine.mark': { light: '#1F6F5C', dark: '#4FB79B' },
  'pine.solid': { light: '#17604E', dark: '#145747' },
  'pine.pressed': { light: '#0F4739', dark: '#0F4739' },
  'pine.wash': { light: '#E6F1ED', dark: '#12352C' },
  'pine.fg': { light: '#145747', dark: '#9BE0CB' },
  'pine.onSolid': { light: '#FFFFFF', dark: '#FFFFFF' },
  // Where the keyboard is
  focus: { light: '#0B5FA5', dark: '#8CC8FF' },
} as const satisfies Record<string, Shade>;

export type PaletteName = keyof typeof palette;
