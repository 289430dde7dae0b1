import type { TraceStory } from '@lampwright/trace';
import { demoId } from './demoId';
import { people } from './people';
import { trailers } from './trailers';

/** The story of a finished trace, from which its events are played. */
export interface DemoTrace extends TraceStory {
  id: string;
  trailerId: string;
  authorId: string;
  /** ISO 8601. */
  openedAt: string;
}

/** Finished traces of the yard: different trailers, circuits and feeds, one with two shorts, one with a dark lamp. */
export const finishedTraces: readonly DemoTrace[] = [
  {
    id: demoId('trace', 1),
    trailerId: trailers.dryVan.id,
    authorId: people.ruben.id,
    name: people.ruben.name,
    openedAt: '2026-11-04T13:10:00.000Z',
    complaint: 'Tail lamps go out with a click as soon as the lamps are switched on.',
    circuits: ['tail'],
    feed: { kind: 'seriesLamp', atHand: true },
    shorts: [
      {
        circuit: 'tail',
        place: { kind: 'run', id: 'run-s6' },
        cause: 'Loom rubbed through on the edge of the rear sill channel.',
        correction: 'Spliced in 0.4 m of wire, new loom, edge guard fitted to the channel.',
        parts: [
          { name: 'Wire, 14 AWG, brown, metre', quantity: 1 },
          { name: 'Edge guard', quantity: 1 },
        ],
      },
    ],
  },
  {
    id: demoId('trace', 2),
    trailerId: trailers.flatbed.id,
    authorId: people.ines.id,
    name: people.ines.name,
    openedAt: '2026-11-06T08:35:00.000Z',
    complaint: 'Side markers dead, driver heard the breaker ticking.',
    circuits: ['markers'],
    feed: { kind: 'breaker', breakerType: 1, atHand: false },
    shorts: [
      {
        circuit: 'markers',
        place: { kind: 'part', id: 'front-clearance-curb' },
        cause: 'Bulb socket full of water and green, the contact touched the shell.',
        correction: 'Lamp replaced, gasket greased.',
        parts: [{ name: 'Clearance lamp, amber, with gasket', quantity: 1 }],
      },
    ],
  },
  {
    id: demoId('trace', 3),
    trailerId: trailers.pup.id,
    authorId: people.ruben.id,
    name: people.ruben.name,
    openedAt: '2026-11-10T15:20:00.000Z',
    complaint: 'Stop lamps trip the tractor after a wash.',
    circuits: ['stop'],
    feed: { kind: 'seriesLamp', atHand: true },
    shorts: [
      {
        circuit: 'stop',
        place: { kind: 'part', id: 'rear-socket' },
        cause: 'Rear socket cover spring broken, contacts bridged by salt and water.',
        correction: 'Rear socket replaced, drain hole cleared.',
        parts: [{ name: 'Seven-way socket', quantity: 1 }],
      },
    ],
  },
  {
    id: demoId('trace', 4),
    trailerId: trailers.containerChassis.id,
    authorId: people.dell.id,
    name: people.dell.name,
    openedAt: '2026-11-13T10:05:00.000Z',
    complaint: 'Left turn, perhaps stop too, blows the fuse when the slider is moved back.',
    circuits: ['left', 'stop'],
    feed: { kind: 'fuse', atHand: true },
    shorts: [
      {
        circuit: 'left',
        place: { kind: 'part', id: 'coil' },
        cause: 'Coiled cable pinched between the slider box and the rail.',
        correction: 'Coiled cable replaced and clipped up.',
        parts: [
          { name: 'Coiled cable, seven conductors', quantity: 1 },
          { name: 'Cable clip', quantity: 2 },
        ],
      },
    ],
  },
  {
    id: demoId('trace', 5),
    trailerId: trailers.refrigerated.id,
    authorId: people.ines.id,
    name: people.ines.name,
    openedAt: '2026-11-18T07:50:00.000Z',
    complaint: 'ABS lamp stays dark at power-up, blue trips the bench supply.',
    circuits: ['abs'],
    feed: { kind: 'tester', atHand: true },
    shorts: [
      {
        circuit: 'abs',
        place: { kind: 'part', id: 'tracker' },
        cause: 'Position tracker wet inside, supply shorted to its case.',
        correction: 'Tracker unplugged and replaced, ABS lamp checked at power-up.',
        parts: [{ name: 'Position tracker', quantity: 1 }],
      },
    ],
  },
  {
    id: demoId('trace', 6),
    trailerId: trailers.carHauler.id,
    authorId: people.dell.id,
    name: people.dell.name,
    openedAt: '2026-11-23T12:30:00.000Z',
    complaint: 'Curb-side markers and tail lamps out after loading.',
    circuits: ['tail'],
    feed: { kind: 'seriesLamp', atHand: true },
    shorts: [
      {
        circuit: 'tail',
        place: { kind: 'part', id: 'm-low-curb-5' },
        cause: 'Marker crushed by a strap hook.',
        correction: 'Marker and grommet replaced.',
        parts: [{ name: 'Side marker, amber, LED', quantity: 1 }],
      },
      {
        circuit: 'tail',
        place: { kind: 'run', id: 'run-t-high-curb-3' },
        cause: 'Wire cut to the strands where the deck pin swings.',
        correction: 'Wire replaced from tee to tee, led behind the post.',
        parts: [{ name: 'Wire, 14 AWG, brown, metre', quantity: 2 }],
      },
    ],
  },
  {
    id: demoId('trace', 7),
    trailerId: trailers.utility.id,
    authorId: people.ruben.id,
    name: people.ruben.name,
    openedAt: '2026-11-27T14:45:00.000Z',
    complaint: 'Right turn blows the fuse at once.',
    circuits: ['right'],
    feed: { kind: 'seriesLamp', atHand: true },
    shorts: [
      {
        circuit: 'right',
        place: { kind: 'part', id: 'turn-splice-curb' },
        cause: 'Old butt splice without sleeve lay against the rail.',
        correction: 'Splice renewed with a sealed sleeve and tied up.',
        parts: [{ name: 'Sealed butt splice', quantity: 1 }],
      },
    ],
    dark: [{ lamp: 'plate', note: 'Bulb broken in its socket, on order.' }],
  },
];
