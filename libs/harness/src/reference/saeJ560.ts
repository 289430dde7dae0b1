import type { Connector } from './connector';
import type { Sourced } from './sourced';

// Many public pages print other numbers under this standard's name, mixed up with the light-vehicle blade connector;
// none of them cites a standard.
const circuit: Sourced = {
  source:
    'Colour and circuit: a trailer wiring specification page compiled from SAE and TMC, and a trailer training glossary. Pin number: the encyclopaedia table of Australian trailer connectors, stated to be based on SAE J560.',
  standing: 'secondary',
};
const size: Sourced = {
  source: 'Summary page of SAE J2394-2020 (1 x 8, 2 x 10, 4 x 12 gauge)',
  standing: 'secondary',
};

/** SAE J560, 12 V, seven contacts: heavy trailers in North America. Sizes are those of SAE J2394 cable. */
export const saeJ560: Connector = {
  name: 'SAE J560',
  aliases: ['J560'],
  volts: 12,
  keptApart: [],
  contacts: [
    { pin: 1, functions: ['ground'], colour: 'white', size: { awg: 8, ...size }, ...circuit },
    {
      pin: 2,
      functions: ['clearance', 'sideMarker', 'plate'],
      colour: 'black',
      size: { awg: 12, ...size },
      varies: true,
      ...circuit,
    },
    {
      pin: 3,
      functions: ['leftTurn', 'hazard'],
      colour: 'yellow',
      size: { awg: 12, ...size },
      ...circuit,
    },
    {
      pin: 4,
      functions: ['stop', 'antilock'],
      colour: 'red',
      size: { awg: 10, source: 'From memory', standing: 'memory' },
      ...circuit,
    },
    {
      pin: 5,
      functions: ['rightTurn', 'hazard'],
      colour: 'green',
      size: { awg: 12, ...size },
      ...circuit,
    },
    {
      pin: 6,
      functions: ['tail', 'clearance', 'sideMarker', 'identification'],
      colour: 'brown',
      size: { awg: 12, ...size },
      varies: true,
      ...circuit,
    },
    {
      pin: 7,
      functions: ['auxiliary', 'antilockPower'],
      colour: 'blue',
      size: { awg: 10, ...size },
      varies: true,
      ...circuit,
    },
  ],
};
