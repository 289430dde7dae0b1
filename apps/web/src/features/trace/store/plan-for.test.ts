import { THOROUGH_STEPS, type Advice, type Plan, type Question } from '@lampwright/isolation';
import type { PlannerClient } from '../../../lib/planner';
import { planFor } from './plan-for';

const question = {} as Question;
const opening = (point: string, expectedSeconds: number): Plan => ({
  kind: 'powerUp',
  advice: { open: [point], expectedSeconds } as Advice,
});

/** A planner that answers when the test says so. */
function slowPlanner() {
  const answers: Record<'first' | 'better', (plan: Plan) => void> = {
    first: () => undefined,
    better: () => undefined,
  };
  const client = {
    ask: (_: string, __: Question, steps: number) =>
      new Promise<Plan>((resolve) => {
        answers[steps === THOROUGH_STEPS ? 'better' : 'first'] = resolve;
      }),
  } as PlannerClient;
  return { client, answers };
}

async function listen() {
  const { client, answers } = slowPlanner();
  const told: (Advice | null)[] = [];
  const stop = planFor(client, question, {
    tell: (advice) => told.push(advice),
    fail: (error) => {
      throw error;
    },
  });
  return { answers, told, stop };
}

describe('planFor', () => {
  beforeEach(() => void vi.useFakeTimers());
  afterEach(() => void vi.useRealTimers());

  it('shows the better answer alone where it comes at once', async () => {
    const { answers, told } = await listen();
    answers.first(opening('P1', 100));
    answers.better(opening('P2', 90));
    await vi.runAllTimersAsync();
    expect(told).toEqual([{ open: ['P2'], expectedSeconds: 90 }]);
  });

  it('shows the first answer when the better one takes its time, and then only sharpens its figures', async () => {
    const { answers, told } = await listen();
    answers.first(opening('P1', 100));
    await vi.advanceTimersByTimeAsync(1_000);
    answers.better(opening('P1', 95));
    await vi.runAllTimersAsync();
    expect(told.map((advice) => advice?.expectedSeconds)).toEqual([100, 95]);
  });

  it('does not move the work to another point once one is shown', async () => {
    const { answers, told } = await listen();
    answers.first(opening('P1', 100));
    await vi.advanceTimersByTimeAsync(1_000);
    answers.better(opening('P2', 60));
    await vi.runAllTimersAsync();
    expect(told).toEqual([{ open: ['P1'], expectedSeconds: 100 }]);
  });

  it('tells nothing once nobody listens', async () => {
    const { answers, told, stop } = await listen();
    answers.first(opening('P1', 100));
    stop();
    answers.better(opening('P1', 95));
    await vi.runAllTimersAsync();
    expect(told).toEqual([]);
  });
});
