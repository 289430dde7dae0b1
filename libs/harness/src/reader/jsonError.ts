/** Where a text stops being JSON; `found` is the character there, `undefined` at the end of the text. */
export interface JsonError {
  /** Both counted from 1. */
  line: number;
  column: number;
  found: string | undefined;
}

/** What may come next; `first...` directly after a bracket, where the list may also end. */
type Expected = 'value' | 'firstValue' | 'key' | 'firstKey' | 'colon' | 'comma' | 'nothing';

/**
 * Finds the first character that JSON does not allow, or `null` for good JSON. Browsers word their parser's message
 * differently and some leave the place out, so the text is walked here. O(length), without recursion.
 */
export function findJsonError(text: string): JsonError | null {
  const offset = errorOffset(text);
  if (offset === null) return null;
  const before = text.slice(0, offset).split(/\r\n|\r|\n/);
  return {
    line: before.length,
    column: (before.at(-1)?.length ?? 0) + 1,
    found: offset < text.length ? String.fromCodePoint(text.codePointAt(offset) ?? 0) : undefined,
  };
}

function errorOffset(text: string): number | null {
  const brackets: string[] = [];
  let expected: Expected = 'value';
  let at = skipSpace(text, 0);
  for (; at < text.length; at = skipSpace(text, at)) {
    const sign = text.charAt(at);
    const step = brackets.at(-1);
    if (expected === 'nothing') return at;
    if (closes(sign, step, expected)) {
      brackets.pop();
      expected = brackets.length > 0 ? 'comma' : 'nothing';
      at++;
    } else if (expected === 'comma' || expected === 'colon') {
      if (sign !== (expected === 'comma' ? ',' : ':')) return at;
      expected = expected === 'comma' && step === '{' ? 'key' : 'value';
      at++;
    } else if (expected === 'key' || expected === 'firstKey') {
      if (sign !== '"') return at;
      const end = endOfText(text, at);
      if (end.wrong) return end.at;
      at = end.at;
      expected = 'colon';
    } else if (sign === '{' || sign === '[') {
      brackets.push(sign);
      expected = sign === '{' ? 'firstKey' : 'firstValue';
      at++;
    } else {
      const end = sign === '"' ? endOfText(text, at) : endOfWord(text, at);
      if (end.wrong) return end.at;
      at = end.at;
      expected = brackets.length > 0 ? 'comma' : 'nothing';
    }
  }
  return expected === 'nothing' ? null : at;
}

function closes(sign: string, open: string | undefined, expected: Expected): boolean {
  if (open === '{') return sign === '}' && (expected === 'firstKey' || expected === 'comma');
  if (open === '[') return sign === ']' && (expected === 'firstValue' || expected === 'comma');
  return false;
}

function skipSpace(text: string, from: number): number {
  let at = from;
  while (' \t\n\r'.includes(text.charAt(at) || '-')) at++;
  return at;
}

interface End {
  at: number;
  wrong: boolean;
}

function endOfText(text: string, from: number): End {
  for (let at = from + 1; at < text.length; at++) {
    const sign = text.charAt(at);
    if (sign === '"') return { at: at + 1, wrong: false };
    if (sign < ' ') return { at, wrong: true };
    if (sign !== '\\') continue;
    const escape = /["\\/bfnrt]|u[0-9a-fA-F]{4}/y;
    escape.lastIndex = at + 1;
    const length = escape.exec(text)?.[0].length;
    if (length === undefined) return { at: at + 1, wrong: true };
    at += length;
  }
  return { at: text.length, wrong: true };
}

function endOfWord(text: string, from: number): End {
  const word = /true|false|null|-?(?:0|[1-9]\d*)(?:\.\d+)?(?:[eE][-+]?\d+)?/y;
  word.lastIndex = from;
  const length = word.exec(text)?.[0].length;
  return { at: from + (length ?? 0), wrong: length === undefined };
}
