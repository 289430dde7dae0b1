/** Short lists to choose from; their words are in the catalogue. */
export const causes = [
  'chafe',
  'pinch',
  'water',
  'pin',
  'melted',
  'screw',
  'splice',
  'module',
] as const;

export const corrections = ['wire', 'sleeve', 'plug', 'clean', 'lamp', 'splice', 'module'] as const;

export const partChoices = ['lamp', 'pigtail', 'plug', 'grommet', 'loom', 'wire', 'fuse'] as const;
