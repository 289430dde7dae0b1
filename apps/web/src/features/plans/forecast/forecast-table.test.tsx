import { screen, within } from '@testing-library/react';
import { sectionTree } from '@lampwright/harness';
import { goodPlan } from '@lampwright/harness/testing';
import { createPlanner, DEFAULT_TIMING, forecast } from '@lampwright/isolation';
import type { PlannerClient } from '../../../lib/planner';
import { fakeServer, ok } from '../../../testing/fake-server';
import { account, plan } from '../../../testing/fixtures';
import { plannerInPlace } from '../../../testing/planner-in-place';
import { renderAt } from '../../../testing/render-at';
import { withoutPlugs } from './testing/without-plugs';

const yard = { 'GET auth/account': ok(account('lead')), 'GET plans/pl1': ok(plan()) };
const [circuit] = goodPlan.circuits;

const table = () => screen.findByRole('table', { name: 'What finding a short will take' });
const rowOf = (table: HTMLElement, name: string) =>
  within(table)
    .getAllByRole('row')
    .find((row) => within(row).queryByText(name))!;
const cells = (row: HTMLElement) =>
  within(row)
    .getAllByRole('cell')
    .map(({ textContent }) => textContent);

describe('the forecast of a plan', () => {
  it('says for each circuit what its planner reckons, beside the habits', async () => {
    fakeServer(yard);
    renderAt('/plans/pl1');
    const shown = await table();
    expect(within(shown).getAllByRole('row')).toHaveLength(goodPlan.circuits.length + 1);
    await within(shown).findAllByText('Proven best:');
    const reckoned = forecast(sectionTree(goodPlan, circuit!.id), DEFAULT_TIMING, createPlanner());
    const [name, expected, worst, powerUps, limit, oneByOne, halving] = cells(
      rowOf(shown, circuit!.name),
    );
    const minutes = (seconds: number) => `${(seconds / 60).toFixed(1)} min`;
    expect(name).toBe(circuit!.name);
    expect(expected).toBe(minutes(reckoned.expectedSeconds));
    expect(worst).toBe(minutes(reckoned.worstSeconds));
    expect(powerUps).toBe(reckoned.expectedPowerUps.toFixed(1));
    expect(reckoned.proven).toBe(true);
    expect(limit).toBe(`Proven best: ${minutes(reckoned.lowerBoundSeconds)}`);
    for (const habit of [oneByOne, halving]) {
      expect(Number.parseFloat(habit!)).toBeGreaterThanOrEqual(Number.parseFloat(expected!));
    }
  });

  it('stands with the names of the circuits while it is worked out', async () => {
    fakeServer(yard);
    const planner: PlannerClient = {
      ...plannerInPlace,
      ask: () => new Promise(() => undefined),
    };
    renderAt('/plans/pl1', { planner });
    const row = rowOf(await table(), circuit!.name);
    expect(within(row).getAllByText('Working…')).toHaveLength(6);
    expect(screen.getByRole('table', { name: 'Parts' })).toBeVisible();
  });

  it('says when the planner fails, and tries again when told to', async () => {
    fakeServer(yard);
    let failing = true;
    const planner: PlannerClient = {
      ...plannerInPlace,
      ask: async (name, args) => {
        if (failing) throw new Error('no worker');
        return plannerInPlace.ask(name, args);
      },
    };
    const { user } = renderAt('/plans/pl1', { planner });
    const alert = await screen.findByRole('alert');
    const row = rowOf(await table(), circuit!.name);
    expect(within(row).getAllByText('Not worked out')).toHaveLength(6);
    failing = false;
    await user.click(within(alert).getByRole('button', { name: 'Try again' }));
    await within(row).findByText('Proven best:');
    expect(screen.queryByRole('alert')).not.toBeInTheDocument();
  });

  it('says where a circuit has nothing to unplug', async () => {
    fakeServer({ ...yard, 'GET plans/pl1': ok(plan({ harness: withoutPlugs(goodPlan) })) });
    renderAt('/plans/pl1');
    const row = rowOf(await table(), circuit!.name);
    expect(within(row).getAllByText('Nothing to unplug')).toHaveLength(6);
  });
});
