import { formatDuration, formatLength, lengthFromField, lengthToField } from './format';

describe('lengths', () => {
  it.each([
    [14.63, '48 ft'],
    [2.59, '8 ft 6 in'],
    [0.3, '1 ft'],
    [0.2, '8 in'],
    [0, '0 in'],
  ])('%d m is %s', (metres, words) => expect(formatLength(metres, 'feet')).toBe(words));

  it('are rounded to a tenth in metres', () => {
    expect(formatLength(14.63, 'metres')).toBe('14.6 m');
  });

  it('come back from a field as they went in, to the millimetre', () => {
    expect(lengthFromField('48', 'feet')).toBe(14.63);
    expect(lengthFromField('2,59', 'metres')).toBe(2.59);
    expect(lengthToField(14.63, 'feet')).toBe('48');
    expect(lengthFromField('', 'feet')).toBeNaN();
    expect(lengthFromField('wide', 'feet')).toBeNaN();
  });
});

describe('durations', () => {
  it.each([
    [0, '0 s'],
    [45.4, '45 s'],
    [60, '1 min'],
    [230, '3 min 50 s'],
    [3600, '1 h'],
    [3900, '1 h 5 min'],
  ])('%d s is %s', (seconds, words) => expect(formatDuration(seconds)).toBe(words));
});
