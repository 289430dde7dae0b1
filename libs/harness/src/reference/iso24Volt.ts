import type { Connector } from './connector';
import type { Sourced } from './sourced';

const programme: Sourced = {
  source:
    "A connector maker's 24 V programme page (German and English columns agree) and a lighting-terms page",
  standing: 'secondary',
};
const memory: Sourced = { source: 'From memory', standing: 'memory' };
const thin = { mm2: 1.5, ...programme };
const thick = { mm2: 2.5, ...programme };

/** ISO 12098, 24 V, 15 contacts; replaces the pair ISO 1185 and ISO 3731. */
export const iso12098: Connector = {
  name: 'ISO 12098',
  aliases: [],
  volts: 24,
  keptApart: [],
  contacts: [
    { pin: 1, functions: ['leftTurn'], colour: 'yellow', size: thin, ...programme },
    { pin: 2, functions: ['rightTurn'], colour: 'green', size: thin, ...programme },
    { pin: 3, functions: ['rearFog'], colour: 'blue', size: thin, ...programme },
    { pin: 4, functions: ['ground'], colour: 'white', size: thick, ...programme },
    {
      pin: 5,
      functions: ['leftTail', 'outlineMarker', 'plate'],
      colour: 'black',
      size: thin,
      ...programme,
    },
    {
      pin: 6,
      functions: ['rightTail', 'outlineMarker', 'plate'],
      colour: 'brown',
      size: thin,
      ...programme,
    },
    { pin: 7, functions: ['stop'], colour: 'red', size: thin, ...programme },
    { pin: 8, functions: ['reversing'], colour: 'pink', size: thin, ...programme },
    { pin: 9, functions: ['continuousSupply'], colour: 'orange', size: thick, ...programme },
    { pin: 10, functions: ['brakeWearSensor'], colour: 'grey', size: thin, ...programme },
    { pin: 11, functions: ['springBrakeSensor'], colour: 'white/black', size: thin, ...programme },
    { pin: 12, functions: ['axleLift'], colour: 'white/blue', size: thin, ...programme },
    {
      pin: 13,
      functions: ['ground'],
      colour: 'white/red',
      groundFor: [14, 15],
      size: thick,
      ...programme,
    },
    { pin: 14, functions: ['canHigh'], colour: 'white/green', size: thin, ...programme },
    { pin: 15, functions: ['canLow'], colour: 'white/brown', size: thin, ...programme },
  ],
};

/** ISO 1185 (24N), 24 V, seven contacts; the same form as SAE J560, with which it must not be joined. */
export const iso1185: Connector = {
  name: 'ISO 1185',
  aliases: ['24N'],
  volts: 24,
  keptApart: [],
  contacts: [
    { pin: 1, label: '31', functions: ['ground'], colour: 'white', ...memory },
    { pin: 2, label: '58L', functions: ['leftTail', 'outlineMarker'], colour: 'black', ...memory },
    { pin: 3, label: 'L', functions: ['leftTurn'], colour: 'yellow', ...memory },
    { pin: 4, label: '54', functions: ['stop'], colour: 'red', ...memory },
    { pin: 5, label: 'R', functions: ['rightTurn'], colour: 'green', ...memory },
    { pin: 6, label: '58R', functions: ['rightTail', 'outlineMarker'], colour: 'brown', ...memory },
    { pin: 7, functions: ['trailerBrake', 'auxiliary'], colour: 'blue', ...memory },
  ],
};
