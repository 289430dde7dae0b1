import fc from 'fast-check';
import { findJsonError } from './jsonError';
import { readHarnessText } from './readHarnessText';

function parses(text: string): boolean {
  try {
    JSON.parse(text);
    return true;
  } catch {
    return false;
  }
}

describe('findJsonError', () => {
  it('finds nothing wrong with JSON', () => {
    fc.assert(
      fc.property(fc.json(), fc.constantFrom(0, 2, '\t'), (text, space) => {
        expect(findJsonError(JSON.stringify(JSON.parse(text), null, space))).toBeNull();
      }),
    );
  });

  it('finds an error exactly where the parser refuses', () => {
    const sign = fc.constantFrom(
      ...[
        '{',
        '}',
        '[',
        ']',
        ',',
        ':',
        '"',
        '"a"',
        '\\',
        '\\u00e',
        '1',
        '-',
        '0',
        '.5',
        'e+',
        '1e5',
      ],
      ...['true', 'null', 'nul', ' ', '\n', '\t', '\u00a0', '\u0001', '{"a":', '[1,', '"\\n"'],
    );
    fc.assert(
      fc.property(fc.array(sign, { maxLength: 10 }), (signs) => {
        const text = signs.join('');
        expect(findJsonError(text) === null).toBe(parses(text));
      }),
      { numRuns: 5000 },
    );
  });

  it('points where a good text was spoilt, or at the word that this spoils', () => {
    fc.assert(
      fc.property(fc.json(), fc.nat(), (text, cut) => {
        const at = cut % text.length;
        const spoilt = `${text.slice(0, at)}\u0001${text.slice(at)}`;
        const { line, column = NaN } = findJsonError(spoilt) ?? {};
        expect(line).toBe(1);
        expect(column).toBeLessThanOrEqual(at + 1);
        expect(spoilt.slice(column - 1, at)).toMatch(/^[-+.\w]*$/);
      }),
    );
  });

  it('counts lines however they end', () => {
    expect(findJsonError('{\r\n\r\n  x')).toEqual({ line: 3, column: 3, found: 'x' });
    expect(findJsonError('{\n\n  x')).toEqual({ line: 3, column: 3, found: 'x' });
  });

  it('walks brackets however deep', () => {
    expect(findJsonError('['.repeat(200_000))).toEqual({ line: 1, column: 200_001 });
  });
});

describe('readHarnessText', () => {
  it('takes the limit that it is given, in bytes', () => {
    expect(readHarnessText('"éé"', { maxBytes: 5 })).toEqual({
      ok: false,
      faults: [{ code: 'tooLarge', path: '', found: 6, wanted: 5 }],
      more: false,
    });
  });

  it('does not mind a byte order mark', () => {
    expect(readHarnessText('\uFEFF5')).toMatchObject({ faults: [{ code: 'wrongType' }] });
  });
});
