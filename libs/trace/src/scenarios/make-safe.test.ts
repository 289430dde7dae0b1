import { cautionsFor } from '../cautions';
import { newRecord, seriesLamp, Teller } from '../testing';
import type { TraceEventBody } from '../events';
import type { Feed } from '../feed';

const stated = (feed: Feed): TraceEventBody => ({
  type: 'intake.stated',
  complaint: 'Lamps out',
  circuits: ['tail'],
  feed,
});

describe('make safe', () => {
  it.each(['seriesLamp', 'tester', 'breaker', 'fuse', 'ohmmeter'] as const)(
    'never powers a tank trailer, not even on a %s',
    (kind) => {
      const trace = new Teller(newRecord({ bodyType: 'tank' }));
      expect(trace.refused(stated({ kind, atHand: true }))).toEqual({
        reason: 'tankTrailer',
        ids: ['trailer-1'],
      });
      expect(trace.step).toBe('intake');
    },
  );

  it('shows the cautions that fit the trailer and the feed', () => {
    const plain = new Teller(newRecord({ abs: false })).says(stated(seriesLamp));
    expect(cautionsFor(plain.context)).toEqual([
      'shopProcedure',
      'placard',
      'chocks',
      'powerOffFirst',
      'jewellery',
      'noBypass',
      'noHolding',
      'hotParts',
    ]);
    const cold = new Teller(
      newRecord({ bodyType: 'refrigerated', secondSources: ['refrigeration'] }),
    ).says(stated(seriesLamp));
    expect(cautionsFor(cold.context)).toEqual(
      expect.arrayContaining(['secondSource', 'highVoltage', 'abs', 'placard']),
    );
    const meter = new Teller().says(stated({ kind: 'ohmmeter', atHand: true }));
    expect(cautionsFor(meter.context)).not.toContain('noHolding');
  });

  it('goes on only with every caution ticked, and ticks only those that fit', () => {
    const trace = new Teller(newRecord({ abs: false })).says(stated(seriesLamp));
    trace.says({ type: 'caution.ticked', caution: 'chocks' });
    trace.says({ type: 'caution.ticked', caution: 'chocks' });
    expect(trace.context.cautions).toEqual(['chocks']);
    expect(trace.refused({ type: 'safety.confirmed' })).toEqual({
      reason: 'cautionsLeft',
      ids: cautionsFor(trace.context).filter((caution) => caution !== 'chocks'),
    });
    expect(trace.refused({ type: 'caution.ticked', caution: 'abs' })).toEqual({
      reason: 'malformed',
      ids: ['abs'],
    });
  });

  it('asks for the caution about holding power when an ohm-meter gives way to power', () => {
    const trace = new Teller().narrows(['tail'], { kind: 'ohmmeter', atHand: true });
    const change = { type: 'feed.changed', feed: seriesLamp } as const;
    expect(trace.refused(change)).toEqual({ reason: 'cautionsLeft', ids: ['noHolding'] });
    trace.says({ type: 'caution.ticked', caution: 'noHolding' }, change);
    expect(trace.context.feed).toEqual(seriesLamp);
  });
});
