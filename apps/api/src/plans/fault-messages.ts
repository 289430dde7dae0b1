import type { HarnessFault, HarnessFaultCode } from '@lampwright/harness';

/** English sentences for users of the API; the web has its own catalogue, by code. */
const MESSAGES: Record<HarnessFaultCode, (fault: HarnessFault) => string> = {
  notJson: () => 'The document is not JSON.',
  tooLarge: ({ found, wanted }) => `The document has ${found}; at most ${wanted} is read.`,
  tooDeep: ({ wanted }) => `The document nests deeper than ${wanted} levels.`,
  wrongFormat: ({ found, wanted }) => `The format is "${found}"; it must be "${wanted}".`,
  missing: ({ wanted }) => `A value is missing${wanted ? `; it must be ${wanted}` : ''}.`,
  wrongType: ({ found, wanted }) => `Here stands ${found}; it must be ${wanted}.`,
  notAllowed: ({ found, wanted }) => `"${found}" is not allowed here; it must be ${wanted}.`,
  empty: ({ wanted }) => `The value is empty${wanted ? `; it must be ${wanted}` : ''}.`,
  notFinite: () => 'The number is not finite.',
  negative: ({ found }) => `The number is ${found}; it must not be negative.`,
  notPositive: ({ found }) => `The number is ${found}; it must be above 0.`,
  notWhole: ({ found }) => `The number is ${found}; it must be whole.`,
  duplicateId: ({ id, others }) => `The id "${id}" is used more than once${list(others)}.`,
  unknownReference: ({ found }) => `"${found}" is not defined in this document.`,
  noInlet: () => 'No part is the inlet; exactly one must be.',
  severalInlets: ({ others }) => `More than one part is the inlet${list(others)}.`,
  inletSeparable: ({ id }) => `The inlet "${id}" must not be separable.`,
  spliceSeparable: ({ id }) => `The splice "${id}" must not be separable.`,
  runToItself: ({ id }) => `The run "${id}" leads from a part to itself.`,
  runIntoInlet: ({ id }) => `The run "${id}" leads into the inlet; the inlet is the feed.`,
  loop: ({ id, circuit, others }) => `"${id}" is in a loop on circuit "${circuit}"${list(others)}.`,
  twoFeeds: ({ id, circuit, others }) =>
    `"${id}" has more than one feed on circuit "${circuit}"${list(others)}.`,
  unreachable: ({ id, circuit }) =>
    `"${id}" is not reached from the inlet on circuit "${circuit}".`,
  loadMissing: ({ id, circuit }) => `"${id}" is fed by circuit "${circuit}" and has no load on it.`,
  loadWithoutFeed: ({ id, circuit }) =>
    `"${id}" has a load on circuit "${circuit}", which does not feed it.`,
  duplicateLoad: ({ id, circuit }) => `"${id}" has more than one load on circuit "${circuit}".`,
  duplicateCircuit: ({ id, found }) => `The run "${id}" names the circuit "${found}" twice.`,
  lampWithoutData: ({ id }) => `The lamp "${id}" has no lamp data.`,
  moduleWithoutData: ({ id }) => `The module "${id}" has no module data.`,
  strayData: ({ id }) => `"${id}" carries data that its kind does not have.`,
};

/** Says what is wrong and what would be right. */
export function faultMessage(fault: HarnessFault): string {
  return MESSAGES[fault.code](fault);
}

function list(ids: string[] | undefined): string {
  return ids?.length ? `: ${ids.join(', ')}` : '';
}
