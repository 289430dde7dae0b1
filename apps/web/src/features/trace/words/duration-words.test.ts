import { durationWords } from './duration-words';
import type { TraceWords } from './use-trace-words';

const t = ((key: string, { count }: { count: number }) => `${count} ${key}`) as TraceWords;

describe('durationWords', () => {
  it.each([
    [0, '5 time.seconds'],
    [71, '70 time.seconds'],
    [89, '90 time.seconds'],
    [95, '1.5 time.minutes'],
    [178, '3 time.minutes'],
    [610, '10 time.minutes'],
  ])('says %d seconds as %s', (seconds, words) => {
    expect(durationWords(seconds, t)).toBe(words);
  });
});
