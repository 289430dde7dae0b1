import { palette } from './palette';

const steps = [
  0, 0.5, 1, 1.5, 2, 2.5, 3, 3.5, 4, 5, 6, 7, 8, 9, 10, 11, 12, 14, 16, 20, 24, 32, 40,
];

/** Chakra's own scale, so that `4` is 16 px. */
const spacing = {
  ...Object.fromEntries(steps.map((step) => [step, { value: `${step * 0.25}rem` }])),
  /** Between two things that a gloved finger could confuse. */
  touch: { value: '12px' },
};

export const tokens = {
  fonts: {
    body: {
      value: '"Source Sans 3 Variable", "Source Sans 3", "Noto Sans", system-ui, sans-serif',
    },
    heading: {
      value: '"Source Sans 3 Variable", "Source Sans 3", "Noto Sans", system-ui, sans-serif',
    },
    mono: { value: 'ui-monospace, "Noto Sans Mono", monospace' },
  },
  fontSizes: {
    sm: { value: '0.9375rem' },
    md: { value: '1.0625rem' },
    lg: { value: '1.1875rem' },
    xl: { value: '1.375rem' },
    '2xl': { value: '1.6875rem' },
    '3xl': { value: '2.125rem' },
    '4xl': { value: '2.75rem' },
  },
  fontWeights: {
    normal: { value: 400 },
    medium: { value: 500 },
    semibold: { value: 600 },
    bold: { value: 700 },
  },
  radii: {
    sm: { value: '6px' },
    md: { value: '10px' },
    lg: { value: '14px' },
    full: { value: '999px' },
  },
  spacing,
  sizes: {
    ...spacing,
    full: { value: '100%' },
    /** The main answers of a trace. */
    answer: { value: '76px' },
    /** Everything else that is used with gloves. */
    field: { value: '56px' },
    /** Screens that are used at a desk. */
    office: { value: '44px' },
  },
  zIndex: { bar: { value: 20 }, popover: { value: 100 }, toast: { value: 200 } },
};

type Leaf = { value: { _light: string; _dark: string } };
type Tree = { [name: string]: Leaf | Tree };

/** `amber.mark` becomes `{ amber: { mark } }`, and `fg` beside `fg.muted` becomes `{ fg: { DEFAULT, muted } }`. */
function nested(): Tree {
  const tree: Record<string, Record<string, Leaf>> = {};
  for (const [name, { light, dark }] of Object.entries(palette)) {
    const [family = name, shade = 'DEFAULT'] = name.split('.');
    tree[family] = { ...tree[family], [shade]: { value: { _light: light, _dark: dark } } };
  }
  return tree;
}

/** The palette as Chakra's semantic tokens. */
export const semanticTokens = { colors: nested() };
