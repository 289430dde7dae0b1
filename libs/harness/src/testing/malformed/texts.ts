import { DEPTH_LIMIT } from '../../reader/depth';
import { DEFAULT_MAX_BYTES } from '../../reader/readHarnessText';
import { plan, type MalformedPlan } from './damage';
import { goodPlan } from './goodPlan';

const good = JSON.stringify(goodPlan, null, 2);

/** Texts that are not JSON, or that hold what nobody reads: too much, too deep, beyond all numbers. */
export const unreadableTexts: MalformedPlan[] = [
  {
    name: 'an empty file',
    text: '',
    faults: [{ code: 'notJson', path: '', line: 1, column: 1 }],
  },
  {
    name: 'a letter instead of a plan',
    text: 'Dear yard,',
    faults: [{ code: 'notJson', path: '', line: 1, column: 1, found: 'D' }],
  },
  {
    name: 'a file cut off in the middle',
    text: '{\n  "format": "lampwright-harness/1",\n  "name": "Sm',
    faults: [{ code: 'notJson', path: '', line: 3, column: 14 }],
  },
  {
    name: 'a comma after the last run',
    text: good.replace(/\}\n {2}\]\n\}$/, '},\n  ]\n}'),
    faults: [
      { code: 'notJson', path: '', line: good.split('\n').length - 1, column: 3, found: ']' },
    ],
  },
  {
    name: 'two plans in one file',
    text: '{"format": "lampwright-harness/1"}\r\n{"format": "lampwright-harness/1"}',
    faults: [{ code: 'notJson', path: '', line: 2, column: 1, found: '{' }],
  },
  {
    name: 'a comment',
    text: '{\n  // the long trailer\n  "name": "Long"\n}',
    faults: [{ code: 'notJson', path: '', line: 2, column: 3, found: '/' }],
  },
  {
    name: 'NaN, for which JSON has no word',
    text: '{ "metres": NaN }',
    faults: [{ code: 'notJson', path: '', line: 1, column: 13, found: 'N' }],
  },
  {
    name: 'a number beyond all numbers',
    text: good.replace('"metres": 6', '"metres": 1e999'),
    faults: [{ code: 'notFinite', path: 'runs[0].metres', id: 'w1', found: 'Infinity' }],
  },
  {
    name: 'a file that is too large',
    text: ' '.repeat(DEFAULT_MAX_BYTES + 1),
    faults: [
      { code: 'tooLarge', path: '', found: DEFAULT_MAX_BYTES + 1, wanted: DEFAULT_MAX_BYTES },
    ],
  },
  {
    name: 'lists within lists within lists',
    text: `{"format":"lampwright-harness/1","name":${'['.repeat(100_000)}${']'.repeat(100_000)}}`,
    faults: [{ code: 'tooDeep', path: '', wanted: DEPTH_LIMIT }],
  },
  {
    name: 'a part that is a deep nest',
    document: plan({ parts: [nest(200)] }),
    faults: [{ code: 'tooDeep', path: '', wanted: DEPTH_LIMIT }],
  },
];

function nest(depth: number): unknown {
  let value: unknown = {};
  for (let level = 0; level < depth; level++) value = { lamp: value };
  return value;
}
