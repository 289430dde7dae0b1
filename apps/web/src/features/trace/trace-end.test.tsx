import { screen, waitFor } from '@testing-library/react';
import type { TraceEventBody } from '@lampwright/trace';
import { Teller } from '@lampwright/trace/testing';
import { renderTrace } from './testing/render-trace';

const at = (name: string | RegExp) => screen.findByRole('heading', { level: 1, name });
const record = (teller: Teller) => teller.log.record;

/** p1 open held and p2 open overloaded: the section between them, with l1 already cleared. */
const atSection = () =>
  new Teller().narrows().reads('holds', 'p1').reads('overload', 'p2').reads('overload', 'p2', 'l1');
const repair: TraceEventBody = {
  type: 'repair.made',
  place: { kind: 'run', id: 'p1-p2' },
  cause: 'Chafed',
  correction: 'Sleeved',
  parts: [],
};
const repaired = () =>
  atSection().says(
    {
      type: 'place.inspected',
      place: { kind: 'run', id: 'p1-p2' },
      method: 'look',
      finding: 'found',
    },
    repair,
  );

describe('from the section to the signature', () => {
  it('goes through the places, the likeliest first, to the find and its repair', async () => {
    const { tap, newest } = await renderTrace(record(atSection()));
    await at(/^Look at/);
    expect(screen.getByText('Power off while you look.')).toBeVisible();
    await tap('Metered');
    await tap('Clear, next place');
    await waitFor(async () =>
      expect(await newest()).toMatchObject({
        type: 'place.inspected',
        method: 'meter',
        finding: 'clear',
      }),
    );
    await tap('Found it here');
    await at('What was it, and what did you do?');
    expect(screen.getByRole('button', { name: 'Repaired, prove it' })).toBeDisabled();
    await tap('Wire chafed through');
    await tap('Wire mended, sleeved and clamped');
    await tap('Grommet');
    await tap('One more: Grommet');
    await tap('Repaired, prove it');
    await waitFor(async () =>
      expect(await newest()).toMatchObject({
        type: 'repair.made',
        cause: 'Wire chafed through',
        parts: [{ name: 'Grommet', quantity: 2 }],
      }),
    );
  });

  it('says when another short is there after the repair', async () => {
    const { tap, heading } = await renderTrace(record(repaired()));
    await at(/^Prove it/);
    expect(
      screen.getByText(/another short: back to narrowing, with what is known kept/),
    ).toBeVisible();
    await tap(/^Lamp lights bright/);
    await waitFor(() => expect(heading()).not.toHaveTextContent(/^Prove/));
    expect(screen.getByText(/There is another short\. What is known is kept/)).toBeInTheDocument();
  });

  it('has what parts the repair from the inlet closed before power', async () => {
    const teller = new Teller()
      .narrows()
      .reads('holds', 'p1')
      .says(
        { type: 'inspection.started' },
        {
          type: 'place.inspected',
          place: { kind: 'run', id: 'p1-p2' },
          method: 'look',
          finding: 'found',
        },
        repair,
      );
    const { tap } = await renderTrace(record(teller));
    await at('Plug back in first');
    expect(screen.queryByRole('button', { name: /^Lamp lights bright/ })).toBeNull();
    await tap(/^Plug p1/);
    await at(/^Prove it/);
  });

  it('offers no way past the points that are still open', async () => {
    const { tap } = await renderTrace(record(repaired()));
    await tap(/^Lamp dark or dim/);
    await at('Plug everything back in');
    const names = screen.getAllByRole('button').map(({ textContent }) => textContent);
    expect(names.filter((name) => !/^(Plug p2|Lamp l1|Undo)/.test(name ?? ''))).toEqual(
      expect.not.arrayContaining([expect.stringMatching(/skip|next|go on/i)]),
    );
    await tap(/^Plug p2/);
    await tap(/^Lamp l1/);
    await at(/^Power Tail, clearance/);
  });

  it('keeps a dark lamp as a finding through to the signed record', async () => {
    const teller = repaired().says(
      { type: 'proof.read', circuit: 'tail', outcome: 'holds' },
      { type: 'point.reconnected', point: 'p2' },
      { type: 'point.reconnected', point: 'l1' },
    );
    const { tap, newest } = await renderTrace(record(teller));
    await at(/^Power Tail, clearance/);
    // A series lamp cannot light them.
    expect(screen.getByText(/use a proper supply/)).toBeVisible();
    await tap('Power holds');
    await at(/Are all its lamps lit/);
    await tap('Lamp by lamp');
    await tap('Lamp l2: Dark');
    await tap(/^The rest is lit/);
    await at(/^Power Stop/);
    await tap('Power holds');
    await tap(/^All lit/);
    await at('Every circuit is checked');
    await tap('Lamp check done');
    await at('Sign the trace');
    expect(screen.getByText(/Lamp l2: Dark/)).toBeVisible();
    expect(screen.getByLabelText('Cause')).toHaveValue('Chafed');
    await tap('Sign and send to the lead');
    await at('Done: unit T-4810');
    expect(screen.getByText(/Lamp l2: Dark/)).toBeVisible();
    expect(screen.getByText(/local codes and licensed practice rule/)).toBeVisible();
    expect(await newest()).toMatchObject({ type: 'trace.signed', cause: 'Chafed' });
  });

  it('steps through the record of a signed trace', async () => {
    const teller = repaired().says(
      { type: 'proof.read', circuit: 'tail', outcome: 'holds' },
      { type: 'point.reconnected', point: 'p2' },
      { type: 'point.reconnected', point: 'l1' },
    );
    const { tap } = await renderTrace(record(teller.finishes()));
    await tap('Step through the record');
    await at('The signature');
    await tap('First');
    await at('Trace opened');
    await tap('Forward');
    await at('Complaint and feed');
    expect(screen.queryByRole('button', { name: /^Undo/ })).toBeNull();
    await tap('Close');
    await at('Done: unit T-4810');
  });
});
