import type { HarnessFaultCode } from '@lampwright/harness';

/**
 * One sentence a fault: what is wrong where, and what would be right. `place` names the path and the id,
 * `onCircuit` the circuit where there is one, `others` the further ids.
 */
export default {
  notJson: '{{place}} stops being JSON at line {{line}}, column {{column}}, at {{found}}.',
  tooLarge: '{{place}} has {{found}} bytes; at most {{wanted}} are read.',
  tooDeep: '{{place}} is nested more than {{wanted}} levels deep, which no plan is.',
  wrongFormat: '{{place}} is {{found}}; this program reads {{wanted}}.',
  missing: '{{place}} is missing; it must be {{wanted}}.',
  wrongType: '{{place}} is {{found}}; it must be {{wanted}}.',
  notAllowed: '{{place}} is {{found}}; allowed: {{others}}.',
  empty: '{{place}} is empty; something must stand there.',
  notFinite: '{{place}} is {{found}}; it must be an ordinary number.',
  negative: '{{place}} is {{found}}; it must be 0 or more.',
  notPositive: '{{place}} is {{found}}; it must be more than 0.',
  notWhole: '{{place}} is {{found}}; it must be a whole number.',
  duplicateId: '{{place}} repeats an id; every id must be its own.',
  unknownReference: '{{place}} names {{found}}, which is not in the plan.',
  noInlet: '{{place}} has no inlet; exactly one part must be the inlet.',
  severalInlets: '{{place}} is one of several inlets ({{others}}); exactly one part may be.',
  inletSeparable: '{{place}} makes the inlet separable; it must not be.',
  spliceSeparable: '{{place}} makes a splice separable; it must not be.',
  runToItself: '{{place}} is a run that starts and ends at the same part.',
  runIntoInlet: '{{place}} is a run into the inlet; the inlet only feeds.',
  loop: '{{place}} closes a loop {{onCircuit}}, through {{others}}; take one run out.',
  twoFeeds: '{{place}} has several feeds {{onCircuit}} ({{others}}); it must have one.',
  unreachable: '{{place}} is not reached from the inlet {{onCircuit}}; a run is missing.',
  loadMissing: '{{place}} has no load {{onCircuit}}, which feeds it; give it one.',
  loadWithoutFeed: '{{place}} is a load {{onCircuit}}, which does not feed it.',
  duplicateLoad: '{{place}} is a second load {{onCircuit}}; one is allowed.',
  duplicateCircuit: '{{place}} names a circuit twice {{onCircuit}}; once is enough.',
  lampWithoutData: '{{place}} is missing; a lamp must say what it draws.',
  moduleWithoutData: '{{place}} is missing; a module must say what it draws.',
  strayData: '{{place}} does not belong there; it is not data of {{wanted}}.',
} as const satisfies Record<HarnessFaultCode, string>;
