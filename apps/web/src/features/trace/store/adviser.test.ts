import { THOROUGH_STEPS, type Advice, type Question } from '@lampwright/isolation';
import type { PlannerClient } from '../../../lib/planner';
import { Adviser } from './adviser';

const opening = (point: string, expectedSeconds: number, more: Partial<Advice> = {}) =>
  ({
    open: [point],
    expectedSeconds,
    worstSeconds: 2 * expectedSeconds,
    lowerBoundSeconds: 50,
    proof: 'notProven',
    ...more,
  }) as Advice;

/** A question for each number; two of the same number have the same content. */
const question = (number = 1) => ({ probabilities: [number] }) as unknown as Question;

interface Answers {
  first: Advice | null | Error;
  thorough?: Advice | Error;
  /** Of the figures of given points, by how long was thought. */
  figures?: { quick: Advice; thorough: Advice };
}

function adviserWith({ first, thorough, figures }: Answers) {
  const asked: string[] = [];
  const answers = { first };
  const given = (answer: Advice | null | Error | undefined) => {
    if (answer === undefined) throw new Error('asked too much');
    if (answer instanceof Error) throw answer;
    return answer;
  };
  const planner = {
    ask: async (name: string, args: unknown[], { background = false, signal }: Options) => {
      const long = args.at(-1) === THOROUGH_STEPS;
      asked.push(`${name} ${long ? 'long' : 'quick'}${background ? ' behind' : ''}`);
      await null;
      signal.throwIfAborted();
      if (name === 'adviceFor') return given(figures?.[long ? 'thorough' : 'quick']);
      return { advice: given(long ? thorough : answers.first), easiestFirstSeconds: 200 };
    },
  } as unknown as PlannerClient;
  const reported: unknown[] = [];
  const adviser = new Adviser(planner, (error) => reported.push(error));
  const shown: (number | undefined)[] = [];
  adviser.subscribe(() => shown.push(adviser.standing(question())?.advice?.expectedSeconds));
  return { adviser, asked, reported, shown, answers };
}

interface Options {
  background?: boolean;
  signal: AbortSignal;
}

const staying = () => new AbortController().signal;

describe('the advice on one question', () => {
  it('is shown at once, and thought no further where it is proven best', async () => {
    const { adviser, asked } = adviserWith({ first: opening('P1', 100, { proof: 'optimal' }) });
    await adviser.consider(question(), staying());
    expect(adviser.standing(question())).toMatchObject({
      advice: { open: ['P1'] },
      easiestFirstSeconds: 200,
      settled: true,
    });
    expect(asked).toEqual(['advise quick']);
  });

  it('is sharpened in the background where it is not', async () => {
    const { adviser, asked, shown } = adviserWith({
      first: opening('P1', 100),
      thorough: opening('P1', 95, { lowerBoundSeconds: 95 }),
    });
    await adviser.consider(question(), staying());
    expect(shown).toEqual([100, 95]);
    expect(asked).toEqual(['advise quick', 'advise long behind']);
    expect(adviser.standing(question())?.advice).toMatchObject({
      proof: 'optimal',
      worstSeconds: 190,
    });
  });

  it('never moves to other points once it is shown: their bound alone is taken over', async () => {
    const { adviser } = adviserWith({
      first: opening('P1', 100),
      thorough: opening('P2', 60, { lowerBoundSeconds: 60, proof: 'optimal' }),
      figures: { quick: opening('P1', 0), thorough: opening('P1', 98) },
    });
    await adviser.consider(question(), staying());
    expect(adviser.standing(question())?.advice).toMatchObject({
      open: ['P1'],
      expectedSeconds: 98,
      lowerBoundSeconds: 60,
      proof: 'notProven',
    });
  });

  it('keeps the figures of a quick thought that found the shorter way', async () => {
    const { adviser } = adviserWith({
      first: opening('P1', 100),
      thorough: opening('P1', 104, { lowerBoundSeconds: 70 }),
    });
    await adviser.consider(question(), staying());
    expect(adviser.standing(question())?.advice).toMatchObject({
      expectedSeconds: 100,
      worstSeconds: 200,
      lowerBoundSeconds: 70,
    });
  });

  it('is there at once when the same question comes again, and is not asked for twice', async () => {
    const { adviser, asked } = adviserWith({ first: opening('P1', 100, { proof: 'optimal' }) });
    await adviser.consider(question(), staying());
    expect(adviser.standing(question())?.advice?.open).toEqual(['P1']);
    expect(adviser.standing(question(2))).toBeNull();
    await adviser.consider(question(), staying());
    expect(asked).toHaveLength(1);
  });

  it('is sharpened later where its screen went before', async () => {
    const { adviser, asked, reported } = adviserWith({
      first: opening('P1', 100),
      thorough: opening('P1', 95),
    });
    const leaving = new AbortController();
    adviser.subscribe(() => leaving.abort());
    await adviser.consider(question(), leaving.signal);
    expect(adviser.standing(question())).toMatchObject({ settled: false });
    await adviser.consider(question(), staying());
    expect(adviser.standing(question())?.advice?.expectedSeconds).toBe(95);
    expect(asked).toEqual(['advise quick', 'advise long behind', 'advise long behind']);
    expect(reported).toEqual([]);
  });

  it('fails where there is no first answer, and can be asked again', async () => {
    const { adviser, answers } = adviserWith({ first: new Error('no worker') });
    await expect(adviser.consider(question(), staying())).rejects.toThrow('no worker');
    answers.first = opening('P1', 100, { proof: 'optimal' });
    await adviser.consider(question(), staying());
    expect(adviser.standing(question())?.advice?.open).toEqual(['P1']);
  });

  it('stands where only the longer thought fails, which is reported', async () => {
    const error = new Error('no worker');
    const { adviser, reported } = adviserWith({ first: opening('P1', 100), thorough: error });
    await adviser.consider(question(), staying());
    expect(adviser.standing(question())?.advice?.expectedSeconds).toBe(100);
    expect(reported).toEqual([error]);
  });

  it('is none where one section is left', async () => {
    const { adviser } = adviserWith({ first: null });
    await adviser.consider(question(), staying());
    expect(adviser.standing(question())).toMatchObject({ advice: null, settled: true });
  });
});

describe('the figures of own points', () => {
  const figures = { quick: opening('P9', 130), thorough: opening('P9', 120) };

  it('are held against advice that was thought as long', async () => {
    const { adviser } = adviserWith({
      first: opening('P1', 100),
      thorough: opening('P1', 80),
      figures,
    });
    await adviser.consider(question(), staying());
    const pairs: (readonly [number, number])[] = [];
    adviser.subscribe(() => {
      const own = adviser.own(question(), ['P9']);
      if (own) pairs.push([own.advice.expectedSeconds, own.beside.expectedSeconds]);
    });
    await adviser.weigh(question(), ['P9'], staying());
    expect(pairs).toEqual([
      [130, 100],
      [120, 80],
    ]);
  });

  it('are thought no further where the advice is proven', async () => {
    const { adviser, asked } = adviserWith({
      first: opening('P1', 100, { proof: 'optimal' }),
      figures,
    });
    await adviser.weigh(question(), ['P9', 'P2'], staying());
    expect(adviser.own(question(), ['P2', 'P9'])?.advice.expectedSeconds).toBe(130);
    await adviser.weigh(question(), ['P2', 'P9'], staying());
    expect(asked).toEqual(['advise quick', 'adviceFor quick']);
  });
});
