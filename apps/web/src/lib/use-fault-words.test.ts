import type { HarnessFault } from '@lampwright/harness';
import { malformedPlans } from '@lampwright/harness/testing';
import i18n from '../i18n/i18n';
import { faultSentence } from './use-fault-words';

const t = i18n.getFixedT('en', ['errors', 'faults'] as const);

const cases = malformedPlans.flatMap(({ name, faults }) =>
  faults.map((fault): [string, HarnessFault] => [`${name}: ${fault.code}`, fault]),
);

describe('the words for faults of a plan', () => {
  it.each(cases)('%s', (_name, fault) => {
    const sentence = faultSentence(t, fault);
    expect(sentence).not.toMatch(/\{\{|\}\}|undefined|\[object/);
    expect(sentence).toMatch(/\.$/);
    expect(sentence).toContain(fault.path === '' ? 'The file' : fault.path);
    if (fault.id !== undefined) expect(sentence).toContain(`“${fault.id}”`);
    if (fault.circuit !== undefined) expect(sentence).toContain(fault.circuit);
  });
});
