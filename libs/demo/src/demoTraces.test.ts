import { contextOf, findings, foldTrace, stepOf } from '@lampwright/trace';
import { demoTraces } from './demoTraces';
import { finishedTraces } from './finishedTraces';

const played = demoTraces().map((record, index) => {
  const story = finishedTraces[index];
  if (!story) throw new Error('more traces than stories');
  return { unit: record.trailer.unit, record, story, log: foldTrace(record) };
});

describe('the played traces', () => {
  it('are one for each story, the same every time', () => {
    expect(played).toHaveLength(finishedTraces.length);
    expect(demoTraces()).toEqual(played.map(({ record }) => record));
  }, 30_000);

  it('share no event id', () => {
    const ids = played.flatMap(({ record }) => record.events.map(({ id }) => id));
    expect(new Set(ids).size).toBe(ids.length);
  });

  it.each(played)('are signed and closed up on $unit, with no event refused', ({ log }) => {
    expect(stepOf(log)).toBe('signed');
    expect(log.skipped).toEqual([]);
    expect(contextOf(log).open).toEqual([]);
  });

  it.each(played)('repair on $unit what the story hides and nothing else', ({ log, story }) => {
    const repaired = contextOf(log).repairs.map(({ place }) => place);
    expect(repaired).toHaveLength(story.shorts.length);
    expect(repaired).toEqual(expect.arrayContaining(story.shorts.map(({ place }) => place)));
    expect(contextOf(log).powerUps.length).toBeGreaterThan(0);
  });

  it.each(played)('leave on $unit the lamps dark that the story leaves dark', ({ log, story }) => {
    const left = findings(contextOf(log));
    expect(left).toEqual(
      (story.dark ?? []).map(({ lamp }) =>
        expect.objectContaining({ kind: 'lamp', lamp, result: 'dark' }),
      ),
    );
  });
});
