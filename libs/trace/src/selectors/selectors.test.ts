import { pointsToCloseFirst } from '../pointsToCloseFirst';
import { suspectedCircuits } from '../circuits';
import { Teller } from '../testing';
import { standing } from './lists';
import { minutesByStep } from './minutesByStep';
import { summaryOf } from './summaryOf';

describe('what screens ask', () => {
  it('sums up an open trace', () => {
    const trace = new Teller().narrows().reads('holds', 'p2');
    expect(summaryOf(trace.log)).toMatchObject({
      step: 'narrow',
      powerUps: 1,
      found: null,
      signedAt: null,
    });
    expect(standing(trace.log)).toMatchObject([{ open: ['p2'], seen: 'holds', hunt: 1 }]);
  });

  it('names the place that was found by the labels of the plan', () => {
    const place = { kind: 'part', id: 'p3', half: 'load' } as const;
    const trace = new Teller().narrows().says({ type: 'inspection.started' });
    trace.says({ type: 'place.inspected', place, method: 'meter', finding: 'found' });
    expect(summaryOf(trace.log).found).toBe('Plug p3');
  });

  it('shares out the minutes among the steps, and undoing takes its time too', () => {
    // The teller lets a minute pass before each event; nine cautions fit this trailer.
    const trace = new Teller().narrows().reads('holds', 'p2').undo();
    expect(minutesByStep(trace.log.record)).toEqual({
      intake: 1,
      makeSafe: 10,
      confirm: 2,
      narrow: 2,
    });
  });

  it('counts nothing where a clock went back', () => {
    const trace = new Teller().starts();
    const events = trace.log.record.events.map((event) => ({
      ...event,
      at: '2026-11-02T07:00:00.000Z',
    }));
    const minutes = minutesByStep({ ...trace.log.record, events });
    expect(Object.values(minutes).every((each) => each === 0)).toBe(true);
  });

  it('lists the circuits that showed the fault, as stated', () => {
    const trace = new Teller().starts(['stop', 'tail']);
    for (const circuit of ['tail', 'stop']) {
      trace.says({ type: 'circuit.confirmed', circuit, outcome: 'overload' });
    }
    expect(suspectedCircuits(trace.context)).toEqual(['stop', 'tail']);
  });

  it('asks to close all of the circuit when handling made the short go away', () => {
    const trace = new Teller().narrows().reads('holds', 'l3');
    trace.says(
      {
        type: 'place.inspected',
        place: { kind: 'part', id: 'l3' },
        method: 'look',
        finding: 'clear',
      },
      { type: 'narrowing.resumed' },
      { type: 'contradiction.explained', meaning: 'repairedByHandling' },
    );
    expect(pointsToCloseFirst(trace.context)).toEqual(['l3']);
  });
});
