import { screen, waitFor, within } from '@testing-library/react';
import { Teller } from '@lampwright/trace/testing';
import type { PlannerClient } from '../../lib/planner';
import { plannerInPlace } from '../../testing/planner-in-place';
import { renderTrace } from './testing/render-trace';

const at = (name: string | RegExp) => screen.findByRole('heading', { level: 1, name });

/** The real planner, which first lets the test say whether it may answer. */
function gated(before: (call: string) => Promise<void> | void): PlannerClient {
  return {
    ...plannerInPlace,
    ask: async (name, args, options) => {
      await before(name);
      return plannerInPlace.ask(name, args, options);
    },
  };
}

const narrowing = () => new Teller().narrows().log.record;

describe('narrowing with a planner that takes its time', () => {
  it('says so while there is no advice, and takes it away with the advice', async () => {
    let answer: () => void = () => undefined;
    const waiting = new Promise<void>((resolve) => {
      answer = resolve;
    });
    await renderTrace(narrowing(), { planner: gated(() => waiting) });
    const words = await screen.findByText('Working out the next power-up…');
    expect(words.closest('[role=status]')).not.toBeNull();
    // What is in question is drawn and counted meanwhile.
    expect(screen.getByText(/places in question/)).toBeVisible();
    expect(screen.queryByRole('button', { name: /^Lamp dark or dim/ })).toBeNull();
    answer();
    await at(/^Unplug/);
    expect(words).not.toBeInTheDocument();
  });

  it('says when there will be no advice, and asks again when told to', async () => {
    let failing = true;
    const planner = gated(() => {
      if (failing) throw new Error('no worker');
    });
    const { user } = await renderTrace(narrowing(), { planner });
    const alert = await screen.findByRole('alert');
    failing = false;
    await user.click(within(alert).getByRole('button', { name: 'Try again' }));
    await at(/^Unplug/);
    expect(screen.queryByRole('alert')).toBeNull();
  });

  it('keeps the picks while their figures are worked out, and says when there will be none', async () => {
    let failing = true;
    const planner = gated((call) => {
      if (failing && call === 'adviceFor') throw new Error('no worker');
    });
    const { tap, user } = await renderTrace(narrowing(), { planner });
    await at(/^Unplug/);
    await tap('Another point');
    for (const pressed of screen.queryAllByRole('button', { pressed: true })) pressed.click();
    await tap(/^Lamp l1/);
    const alert = await screen.findByRole('alert');
    expect(
      within(screen.getByRole('main')).getByRole('button', { name: /^Lamp l1/ }),
    ).toHaveAttribute('aria-pressed', 'true');
    failing = false;
    await user.click(within(alert).getByRole('button', { name: 'Try again' }));
    await screen.findByText(/^Lamp l1\. Splits what is left/);
  });

  it('shows the same points at once after something else was recorded', async () => {
    const asked: string[] = [];
    const planner = gated((call) => void asked.push(call));
    const { tap, store, heading } = await renderTrace(narrowing(), { planner });
    await at(/^Unplug/);
    const first = heading().textContent;
    const before = asked.length;
    await tap('Another point');
    for (const pressed of screen.queryAllByRole('button', { pressed: true })) pressed.click();
    await tap(/^Lamp l1/);
    await screen.findByText(/^Lamp l1\. Splits what is left/);
    await tap('Use these');
    await at('Unplug Lamp l1');
    await store.record({
      type: 'event.undone',
      target: store.getActor().getSnapshot().context.log.record.events.at(-1)!.id,
    });
    await waitFor(() => expect(heading().textContent).toBe(first));
    expect(asked.slice(before).filter((call) => call === 'advise')).toEqual([]);
  });
});
