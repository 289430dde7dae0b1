import { setup, type SnapshotFrom } from 'xstate';
import { actions } from './actions';
import type { TraceEvent } from './events';
import { guards } from './guards';
import { openingContext } from './openingContext';
import type { TraceRecord } from './record';
import type { TraceContext } from './state';

/** What a screen asks of a step, so that it compares no state names. */
export type TraceTag =
  /** Power goes on the trailer in this step: its cautions belong on the screen. */
  | 'powers'
  /** The next power-up is to be planned. */
  | 'deciding'
  /** The readings contradict each other and a person has to say what that means. */
  | 'contradicted'
  /** The protection has to cool, or a gentler feed to take its place. */
  | 'coolDown'
  /** No circuit shows the fault any more. */
  | 'nothingWrong'
  /** Nothing more can be added. */
  | 'ended';

const feed = { guard: 'mayChangeFeed', actions: 'changeFeed' } as const;
const caution = { guard: 'mayTick', actions: 'tick' } as const;
const damage = { guard: 'mayNoteDamage', actions: 'noteDamage' } as const;
const bar = { guard: 'mayBar', actions: 'barPoint' } as const;
const allow = { guard: 'mayAllow', actions: 'allowPoint' } as const;
const abandon = { guard: 'mayAbandon', target: '#trace.abandoned' } as const;

/**
 * One trace, from the complaint to the signature. The chart only arranges: what may happen is a rule, what it makes of
 * the context a change, each a plain function of its own. Nothing waits on a clock, nothing is invoked and no entry
 * action matters, so that a list of events folds to the same state anywhere and at any time. State names are part of
 * what people have seen and stored; renaming one is a change of format.
 */
export const traceMachine = setup({
  types: {
    context: {} as TraceContext,
    events: {} as TraceEvent,
    input: {} as Omit<TraceRecord, 'events'>,
    tags: {} as TraceTag,
  },
  guards,
  actions,
}).createMachine({
  id: 'trace',
  context: ({ input }) => openingContext(input),
  initial: 'intake',
  states: {
    intake: {
      on: {
        'intake.stated': { guard: 'mayState', target: 'makeSafe', actions: 'state' },
        'trace.abandoned': abandon,
      },
    },
    makeSafe: {
      on: {
        'caution.ticked': caution,
        'safety.confirmed': { guard: 'maySetOut', target: 'confirm' },
        'trace.abandoned': abandon,
      },
    },
    confirm: {
      tags: ['powers'],
      on: { 'feed.changed': feed, 'caution.ticked': caution, 'trace.abandoned': abandon },
      initial: 'reading',
      states: {
        reading: {
          on: {
            'circuit.confirmed': { guard: 'mayConfirm', actions: 'confirm' },
            'confirm.finished': [
              { guard: 'faultConfirmed', target: '#trace.narrow', actions: 'beginNarrowing' },
              { guard: 'nothingConfirmed', target: 'nothingWrong' },
            ],
          },
        },
        nothingWrong: {
          tags: ['nothingWrong'],
          on: {
            'wiggle.read': [
              { guard: 'wiggleShows', target: '#trace.narrow', actions: 'beginAfterWiggle' },
              { guard: 'mayWiggle', actions: 'wiggle' },
            ],
            'nothing.found': '#trace.lampCheck',
          },
        },
      },
    },
    narrow: {
      on: {
        'feed.changed': feed,
        'caution.ticked': caution,
        'damage.seen': damage,
        'trace.abandoned': abandon,
      },
      initial: 'deciding',
      states: {
        deciding: {
          tags: ['powers', 'deciding'],
          always: [
            { guard: 'isContradicted', target: 'contradicted' },
            { guard: 'isKnown', target: '#trace.inspect' },
            { guard: 'isHot', target: 'coolDown' },
          ],
          on: {
            'circuit.chosen': { guard: 'mayChooseCircuit', actions: 'chooseCircuit' },
            'point.barred': bar,
            'point.allowed': allow,
            'powerUp.chosen': { guard: 'mayChoosePowerUp', actions: 'choosePowerUp' },
            'reading.taken': { guard: 'mayRead', actions: 'takeReading' },
            'inspection.started': '#trace.inspect',
          },
        },
        contradicted: {
          tags: ['contradicted'],
          always: { guard: 'isExplained', target: 'deciding' },
          on: {
            'contradiction.explained': [
              { guard: 'wasHandled', target: '#trace.prove', actions: 'explain' },
              { guard: 'mayExplain', actions: 'explain' },
            ],
          },
        },
        coolDown: {
          tags: ['coolDown'],
          always: [
            { guard: 'isCool', target: 'deciding' },
            { guard: 'isKnown', target: '#trace.inspect' },
          ],
          on: {
            'coolDown.taken': { actions: 'coolDown' },
            'circuit.chosen': { guard: 'mayChooseCircuit', actions: 'chooseCircuit' },
            'point.barred': bar,
            'point.allowed': allow,
            'powerUp.chosen': { guard: 'mayChoosePowerUp', actions: 'choosePowerUp' },
            'inspection.started': '#trace.inspect',
          },
        },
      },
    },
    inspect: {
      on: {
        'place.inspected': [
          { guard: 'isFound', target: 'repair', actions: 'inspect' },
          { guard: 'mayInspect', actions: 'inspect' },
        ],
        'narrowing.resumed': { guard: 'mayResume', target: 'narrow', actions: 'resume' },
        'damage.seen': damage,
        'point.barred': bar,
        'point.allowed': allow,
        'feed.changed': feed,
        'caution.ticked': caution,
        'trace.abandoned': abandon,
      },
    },
    repair: {
      on: { 'repair.made': { guard: 'mayRepair', target: 'prove', actions: 'repair' } },
    },
    prove: {
      tags: ['powers'],
      always: [
        { guard: 'provenAndClosed', target: 'lampCheck' },
        { guard: 'isProven', target: 'reconnect' },
      ],
      on: {
        'proof.read': [
          { guard: 'proofFails', target: 'narrow', actions: 'prove' },
          { guard: 'mayProve', actions: 'prove' },
        ],
        'point.reconnected': { guard: 'mayReconnect', actions: 'reconnect' },
        'feed.changed': feed,
        'caution.ticked': caution,
      },
    },
    reconnect: {
      always: { guard: 'allClosed', target: 'lampCheck' },
      on: { 'point.reconnected': { guard: 'mayReconnect', actions: 'reconnect' } },
    },
    lampCheck: {
      tags: ['powers'],
      on: {
        'circuit.powered': [
          { guard: 'stillOverloads', target: 'narrow', actions: 'power' },
          { guard: 'mayPower', actions: 'power' },
        ],
        'lamp.checked': { guard: 'mayCheckLamp', actions: 'checkLamp' },
        'circuit.allLit': { guard: 'mayLightAll', actions: 'lightAll' },
        'lampCheck.finished': { guard: 'lampsChecked', target: 'sign' },
        'feed.changed': feed,
        'caution.ticked': caution,
      },
    },
    sign: {
      on: { 'trace.signed': { guard: 'maySign', target: 'signed', actions: 'sign' } },
    },
    signed: { tags: ['ended'], type: 'final' },
    abandoned: { tags: ['ended'], type: 'final' },
  },
});

export type TraceSnapshot = SnapshotFrom<typeof traceMachine>;
