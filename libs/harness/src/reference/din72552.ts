import type { Sourced } from './sourced';

export type TerminalMeaning =
  | 'ignitionSwitched'
  | 'battery'
  | 'ground'
  | 'switchedGround'
  | 'flasherIn'
  | 'flasherOut'
  | 'leftTurn'
  | 'rightTurn'
  | 'stop'
  | 'trailerAuxiliary'
  | 'frontFog'
  | 'headlamp'
  | 'mainBeam'
  | 'dippedBeam'
  | 'tail'
  | 'leftTail'
  | 'rightTail'
  | 'dimmedPanel';

export interface Terminal extends Sourced {
  label: string;
  meaning: TerminalMeaning;
}

const reprint: Sourced = {
  source: 'Encyclopaedia table of DIN 72552 and two technical reprints',
  standing: 'secondary',
};
const memory: Sourced = {
  source: 'From memory: rows of DIN 72552 beyond those read',
  standing: 'memory',
};

/** DIN 72552 terminal labels as found on trailers. */
export const DIN_72552: readonly Terminal[] = [
  { label: '15', meaning: 'ignitionSwitched', ...reprint },
  { label: '30', meaning: 'battery', ...reprint },
  { label: '31', meaning: 'ground', ...reprint },
  { label: '31b', meaning: 'switchedGround', ...reprint },
  { label: '49', meaning: 'flasherIn', ...reprint },
  { label: '49a', meaning: 'flasherOut', ...reprint },
  { label: 'L', meaning: 'leftTurn', ...reprint },
  { label: 'R', meaning: 'rightTurn', ...reprint },
  { label: '54', meaning: 'stop', ...memory },
  { label: '54g', meaning: 'trailerAuxiliary', ...memory },
  { label: '55', meaning: 'frontFog', ...memory },
  { label: '56', meaning: 'headlamp', ...memory },
  { label: '56a', meaning: 'mainBeam', ...memory },
  { label: '56b', meaning: 'dippedBeam', ...memory },
  { label: '58', meaning: 'tail', ...memory },
  { label: '58L', meaning: 'leftTail', ...memory },
  { label: '58R', meaning: 'rightTail', ...memory },
  { label: '58d', meaning: 'dimmedPanel', ...memory },
];
