import { situation } from '../situation';
import { Teller } from '../testing';

const chanceOf = (trace: Teller, id: string) =>
  situation(trace.context)!
    .placesInQuestion.filter(({ ref }) => ref.id === id)
    .reduce((sum, { probability }) => sum + probability, 0);

/** The run that both circuits share beside the one that only the narrowed circuit has. */
const sharedOverOwn = (trace: Teller) => chanceOf(trace, 'p1-p2') / chanceOf(trace, 'p1-l1');

describe('two circuits that trip', () => {
  it('make a place that carries both five times as likely beside one that carries a single one', () => {
    const one = new Teller().narrows(['tail']);
    const two = new Teller()
      .narrows(['tail', 'stop'])
      .says({ type: 'circuit.chosen', circuit: 'tail' });
    expect(sharedOverOwn(two) / sharedOverOwn(one)).toBeCloseTo(5, 9);
  });

  it('say nothing more once one of them holds again', () => {
    const trace = new Teller()
      .narrows(['tail', 'stop'])
      .says({ type: 'circuit.chosen', circuit: 'tail' })
      .reads('overload', 'p1');
    const place = { kind: 'run', id: 'inlet-p1' } as const;
    trace.says(
      { type: 'place.inspected', place, method: 'look', finding: 'found' },
      { type: 'repair.made', place, cause: 'Cut', correction: 'Mended', parts: [] },
      { type: 'point.reconnected', point: 'p1' },
      { type: 'proof.read', circuit: 'tail', outcome: 'holds' },
      { type: 'proof.read', circuit: 'stop', outcome: 'overload' },
    );
    expect(trace.context.circuit).toBe('stop');
    expect(sharedOverOwn(trace)).toBeCloseTo(sharedOverOwn(new Teller().narrows(['stop'])), 9);
  });
});

describe('the question to a planner', () => {
  it('tells what is open on other circuits, and what was open at the last power-up', () => {
    const trace = new Teller()
      .narrows(['tail', 'stop'])
      .says({ type: 'circuit.chosen', circuit: 'tail' })
      .reads('overload', 'l1', 'p2')
      .says({ type: 'circuit.chosen', circuit: 'stop' });
    expect(situation(trace.context)!.question).toMatchObject({
      open: ['l1', 'p2'],
      elsewhere: [{ partId: 'l1', openSeconds: 10, closeSeconds: 10, along: 4 }],
      poweredWith: [],
    });
    trace.reads('overload', 'p3', 'l1');
    expect(situation(trace.context)!.question?.poweredWith).toEqual(['p3', 'l1']);
  });
});
