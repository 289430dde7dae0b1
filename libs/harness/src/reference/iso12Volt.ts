import type { Connector, Contact, KeptApart } from './connector';
import type { Sourced } from './sourced';

const table: Sourced = {
  source:
    "A connector maker's contact allocation table (German and French versions agree), connector-maker standards pages and an encyclopaedia",
  standing: 'secondary',
};
const rule: Sourced = {
  source: 'Footnotes of the same allocation table, and an older 13-pin plan',
  standing: 'secondary',
};
const thin = { mm2: 1.5, ...table };
const thick = { mm2: 2.5, ...table };

/** Tail lamps left and right are separate circuits; a plate lamp must not be fed from both. */
const tailsApart: KeptApart = { pins: [5, 7], ...rule };

const lighting: readonly Contact[] = [
  { pin: 1, label: 'L', functions: ['leftTurn'], colour: 'yellow', size: thin, ...table },
  // Older trailers have an auxiliary supply here.
  { pin: 2, label: '54g', functions: ['rearFog'], colour: 'blue', size: thin, ...table },
  { pin: 3, label: '31', functions: ['ground'], colour: 'white', size: thick, ...table },
  { pin: 4, label: 'R', functions: ['rightTurn'], colour: 'green', size: thin, ...table },
  {
    pin: 5,
    label: '58R',
    functions: ['rightTail', 'outlineMarker', 'plate'],
    colour: 'brown',
    size: thin,
    ...table,
  },
  { pin: 6, label: '54', functions: ['stop'], colour: 'red', size: thin, ...table },
  {
    pin: 7,
    label: '58L',
    functions: ['leftTail', 'outlineMarker', 'plate'],
    colour: 'black',
    size: thin,
    ...table,
  },
];

/** ISO 1724 (12N), 12 V, seven contacts, black. */
export const iso1724: Connector = {
  name: 'ISO 1724',
  aliases: ['12N'],
  volts: 12,
  contacts: lighting,
  keptApart: [tailsApart],
};

/** ISO 3732 (12S), 12 V, seven contacts, white, beside a 12N. Contact 2 is not in the source and is left out. */
export const iso3732: Connector = {
  name: 'ISO 3732',
  aliases: ['12S'],
  volts: 12,
  contacts: [
    { pin: 1, functions: ['reversing'], colour: 'yellow', ...table },
    { pin: 3, functions: ['ground'], colour: 'white', groundFor: [4], ...table },
    { pin: 4, functions: ['continuousSupply'], colour: 'green', ...table },
    { pin: 5, functions: ['unallocated'], colour: 'brown', ...table },
    { pin: 6, functions: ['switchedSupply'], colour: 'red', ...table },
    { pin: 7, functions: ['ground'], colour: 'black', groundFor: [6], ...table },
  ],
  keptApart: [{ pins: [3, 7], ...rule }],
};

/** ISO 11446, 12 V, 13 contacts. Colours above contact 8 are not reliable in the field: public tables conflict. */
export const iso11446: Connector = {
  name: 'ISO 11446',
  aliases: [],
  volts: 12,
  contacts: [
    ...lighting.map((contact) =>
      contact.pin === 3 ? { ...contact, groundFor: [1, 2, 4, 5, 6, 7, 8] } : contact,
    ),
    { pin: 8, functions: ['reversing'], colour: 'pink', ...table },
    {
      pin: 9,
      functions: ['continuousSupply'],
      colour: 'orange',
      size: thick,
      varies: true,
      ...table,
    },
    { pin: 10, functions: ['switchedSupply'], colour: 'grey', size: thick, varies: true, ...table },
    {
      pin: 11,
      functions: ['ground'],
      colour: 'white/black',
      groundFor: [10],
      varies: true,
      ...table,
    },
    { pin: 12, functions: ['trailerPresent'], ...table },
    {
      pin: 13,
      functions: ['ground'],
      colour: 'white/red',
      groundFor: [9],
      size: thick,
      varies: true,
      ...table,
    },
  ],
  keptApart: [tailsApart, { pins: [3, 11, 13], ...rule }],
};
