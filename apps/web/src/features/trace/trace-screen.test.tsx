import { screen, waitFor, within } from '@testing-library/react';
import { fuse, newRecord, Teller } from '@lampwright/trace/testing';
import { renderTrace } from './testing/render-trace';

const at = (name: string | RegExp) => screen.findByRole('heading', { level: 1, name });
const record = (teller: Teller) => teller.log.record;

describe('intake and make safe', () => {
  it('states complaint, circuits and feed with touches alone, and ticks every caution', async () => {
    const { tap, newest } = await renderTrace(newRecord());
    await at('What is the complaint?');
    expect(screen.getByText(/local codes and licensed practice rule/)).toBeVisible();
    expect(screen.getByRole('button', { name: 'Next' })).toBeDisabled();
    await tap('Fuse blows or breaker trips');
    await tap('Next');
    await tap(/^Tail, clearance/);
    await tap('Next');
    await tap(/^Tractor or battery through a breaker/);
    expect(screen.getByText(/Watch each power-up a minute or two/)).toBeVisible();
    await tap(/^Yes, at hand/);
    expect(screen.getByRole('button', { name: 'Start' })).toBeDisabled();
    await tap(/^Closes again by itself/);
    await tap('Start');
    await at('Make it safe first');
    expect(await newest()).toMatchObject({
      type: 'intake.stated',
      complaint: 'Fuse blows or breaker trips',
      circuits: ['tail'],
      feed: { kind: 'breaker', breakerType: 1, atHand: true },
    });
    expect(screen.getByRole('button', { name: /left$/ })).toBeDisabled();
    for (;;) {
      const open = screen.queryAllByRole('button', { pressed: false });
      if (open.length === 0) break;
      open[0]!.click();
      await waitFor(() =>
        expect(screen.queryAllByRole('button', { pressed: false })).toHaveLength(open.length - 1),
      );
    }
    await tap('All safe, go on');
    await at(/^Power Tail, clearance/);
    // A type I breaker closes again: a glance is not enough.
    expect(screen.getByText(/Watch it a minute or two/)).toBeVisible();
  });

  it('shows no way on for a tank trailer', async () => {
    await renderTrace(newRecord({ bodyType: 'tank' }));
    expect(await screen.findByRole('alert')).toHaveTextContent(/certified clean and gas-free/);
    expect(screen.queryByRole('button', { name: 'Next' })).toBeNull();
  });

  it('names the second sources of the trailer', async () => {
    const teller = new Teller(newRecord({ secondSources: ['battery', 'liftGate'] })).says({
      type: 'intake.stated',
      complaint: '',
      circuits: ['tail'],
      feed: { kind: 'tester', atHand: true },
    });
    await renderTrace(record(teller));
    expect(await screen.findByText(/its own battery and a lift gate/)).toBeVisible();
  });
});

describe('confirm', () => {
  it('asks in the words of the feed', async () => {
    await renderTrace(record(new Teller().starts()));
    expect(await screen.findByRole('button', { name: 'Lamp lights bright' })).toBeVisible();
    expect(screen.getByRole('button', { name: 'Lamp dark or dim' })).toBeVisible();
    // Through a series lamp the trailer's lamps say nothing.
    expect(screen.queryByRole('button', { name: /lamps stay dark/ })).toBeNull();
  });

  it('keeps amps with the answer', async () => {
    const { tap, user, newest } = await renderTrace(record(new Teller().starts()));
    await tap('Add amps');
    await user.type(screen.getByLabelText(/Amps/), '2,1');
    await tap(/^Lamp lights bright/);
    await at('What power showed');
    expect(await newest()).toMatchObject({ type: 'circuit.confirmed', amps: 2.1 });
  });

  it('says what amps mean as they are typed', async () => {
    const { tap, user } = await renderTrace(record(new Teller().starts(['tail'], fuse)));
    await tap('Add amps');
    const field = screen.getByLabelText(/Amps/);
    await user.type(field, '2,1');
    expect(screen.getByText(/^More than healthy lamps draw/)).toBeVisible();
    expect(screen.getByText(/a short that does not trip may be/)).toBeVisible();
    await user.clear(field);
    await user.type(field, '0,3');
    expect(screen.getByText(/^Less than all its lamps draw/)).toBeVisible();
    expect(screen.getByText(/^May be dark: /)).toBeVisible();
  });

  it('says nothing of amps that a lamp in series sets', async () => {
    const { tap, user } = await renderTrace(record(new Teller().starts()));
    await tap('Add amps');
    await user.type(screen.getByLabelText(/Amps/), '2,1');
    expect(screen.queryByText(/healthy lamps draw/)).toBeNull();
  });

  it('says so when nothing is wrong, and offers the wiggle check instead of a fault', async () => {
    const { tap, newest } = await renderTrace(record(new Teller().starts()));
    await tap(/^Lamp dark or dim/);
    await tap('None of them is short: go on');
    await at('Nothing is wrong now');
    await tap(/^Tail, clearance/);
    await at(/move the harness by hand/);
    await tap(/^Lamp lights bright/);
    await at(/^Unplug/);
    expect(await newest()).toMatchObject({ type: 'wiggle.read', outcome: 'overload' });
  });
});

describe('narrow', () => {
  it('records the reading with what was advised', async () => {
    const { tap, heading, newest } = await renderTrace(record(new Teller().narrows()));
    await at(/^Unplug/);
    const first = heading().textContent;
    await tap(/^Lamp dark or dim/);
    await waitFor(() => expect(heading().textContent).not.toBe(first));
    expect(heading()).toHaveFocus();
    const event = await newest();
    expect(event).toMatchObject({ type: 'reading.taken', circuit: 'tail', outcome: 'holds' });
    expect(event?.type === 'reading.taken' && event.advised).toEqual(
      event?.type === 'reading.taken' && event.open,
    );
  });

  it('says power off first, then what to close, then what to open, all before the question', async () => {
    // p2 is open and held, so the short is behind it: it has to be closed before the next one is opened.
    const teller = new Teller().narrows().reads('holds', 'p2');
    await renderTrace(record(teller));
    await at(/^Unplug/);
    const order = screen.getByRole('list', { name: 'In this order' });
    const steps = within(order)
      .getAllByRole('listitem')
      .map((item) => item.textContent);
    expect(steps[0]).toMatch(/^Plug Plug p2 back in/);
    expect(steps[1]).toMatch(/^Then unplug/);
    const off = screen.getByText('Power off first.');
    const ask = screen.getByRole('heading', { level: 2, name: /power on/i });
    const follows = Node.DOCUMENT_POSITION_FOLLOWING;
    expect(off.compareDocumentPosition(order) & follows).toBeTruthy();
    expect(order.compareDocumentPosition(ask) & follows).toBeTruthy();
  });

  it('lets a person pick other points, with the figures of that choice', async () => {
    const { tap, newest, heading } = await renderTrace(record(new Teller().narrows()));
    await at(/^Unplug/);
    await tap('Another point');
    for (const pressed of screen.queryAllByRole('button', { pressed: true })) pressed.click();
    await tap(/^Lamp l1/);
    expect(screen.getByText(/^Lamp l1\. Splits what is left/)).toBeVisible();
    await tap('Use these');
    await waitFor(() => expect(heading()).toHaveTextContent('Unplug Lamp l1'));
    expect(await newest()).toMatchObject({ type: 'powerUp.chosen', open: ['l1'] });
    await tap(/^Lamp lights bright/);
    await waitFor(async () =>
      expect(await newest()).toMatchObject({ type: 'reading.taken', open: ['l1'] }),
    );
  });

  it('does not power an unchanged state', async () => {
    const { tap } = await renderTrace(record(new Teller().narrows()));
    await at(/^Unplug/);
    await tap('Another point');
    for (const pressed of screen.queryAllByRole('button', { pressed: true })) pressed.click();
    expect(await screen.findByText(/Change something before power goes on/)).toBeVisible();
    expect(screen.getByRole('button', { name: 'Use these' })).toBeDisabled();
  });

  it('leaves out a point that cannot be reached, and allows it again', async () => {
    const { tap, heading, newest } = await renderTrace(record(new Teller().narrows()));
    await at(/^Unplug/);
    const first = heading().textContent;
    await tap('Can’t reach it');
    await tap(/Seized, covered/);
    await waitFor(() => expect(heading().textContent).not.toBe(first));
    await at(/^Unplug/);
    expect(heading().textContent).not.toBe(first);
    await tap('Another point');
    await tap(/^Allow .* again/);
    expect(await newest()).toMatchObject({ type: 'point.allowed' });
  });

  it('takes back the last reading', async () => {
    const { tap, undo, heading } = await renderTrace(record(new Teller().narrows()));
    await at(/^Unplug/);
    const first = heading().textContent;
    await tap(/^Lamp dark or dim/);
    await waitFor(() => expect(heading().textContent).not.toBe(first));
    await undo();
    await waitFor(() => expect(heading().textContent).toBe(first));
    expect(screen.getByText('Taken back: a reading.')).toBeInTheDocument();
  });

  it('ignores the second half of a double tap', async () => {
    const { user, server, store, heading } = await renderTrace(record(new Teller().narrows()), {
      pause: 60_000,
    });
    await at(/^Unplug/);
    const first = heading().textContent;
    const before = server.record().events.length;
    await user.dblClick(screen.getByRole('button', { name: /^Lamp dark or dim/ }));
    await waitFor(() => expect(heading().textContent).not.toBe(first));
    await store.send();
    expect(server.record().events).toHaveLength(before + 1);
  });

  it('leaves the meaning of a contradiction to the person, among those that fit', async () => {
    const teller = new Teller().narrows().reads('overload', 'p2').reads('holds');
    const { tap, newest } = await renderTrace(record(teller));
    await at('The readings do not fit together');
    expect(screen.getByRole('button', { name: /^Handling it cured it/ })).toBeVisible();
    // Another short cannot make everything hold.
    expect(screen.queryByRole('button', { name: /more than one short/ })).toBeNull();
    await tap(/^It comes and goes/);
    expect(await newest()).toMatchObject({
      type: 'contradiction.explained',
      meaning: 'comesAndGoes',
    });
  });

  it('asks for a cool-down after the limit of hard trips, and offers a gentler feed', async () => {
    const teller = new Teller()
      .narrows(['tail'], { kind: 'fuse', atHand: true })
      .reads('overload', 'l1')
      .reads('overload', 'l2');
    const { tap, newest } = await renderTrace(record(teller));
    await at('Let it cool down');
    expect(screen.queryByRole('button', { name: 'Fuse blew' })).toBeNull();
    await tap('Change to a gentler feed');
    await tap(/^Series lamp/);
    await tap('Use this feed');
    await at(/^Unplug/);
    expect(await newest()).toMatchObject({ type: 'feed.changed', feed: { kind: 'seriesLamp' } });
  });

  it('has the cautions of a feed with power ticked before an ohm-meter gives way to it', async () => {
    const teller = new Teller().narrows(['tail'], { kind: 'ohmmeter', atHand: true });
    const { tap, newest } = await renderTrace(record(teller));
    await at(/^Unplug/);
    await tap('More');
    await tap('Change the feed');
    await tap(/^Series lamp/);
    expect(screen.getByRole('button', { name: '1 left' })).toBeDisabled();
    await tap(/^Power on an overload only as long/);
    await tap('Use this feed');
    await at(/^Unplug/);
    expect(await newest()).toMatchObject({ type: 'feed.changed', feed: { kind: 'seriesLamp' } });
  });
});
