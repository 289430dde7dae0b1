/** A fault lists no more others than a person would read; `found` then gives their full number. */
export const OTHERS_SHOWN = 20;

/**
 * A fault in a plan document. It carries facts; the words are the web's.
 *
 * `path` points into the document the way a person would write it (`runs[3].from`); `id` is the offending
 * circuit's, part's or run's own id where it has one; `found` is what stands there and `wanted` what would be right.
 */
export interface HarnessFault {
  code: HarnessFaultCode;
  path: string;
  id?: string;
  found?: string | number;
  wanted?: string | number;
  /** The circuit on which the fault shows, for faults of the tree. */
  circuit?: string;
  /**
   * What else a person needs to see, at most `OTHERS_SHOWN` of it: the parts of a loop, the runs that feed a part
   * twice, the parts that hang on an unreachable one, the several inlets, the values that are allowed.
   */
  others?: string[];
  /** Where a text stops being JSON, both counted from 1. */
  line?: number;
  column?: number;
}

/** Every way in which a document can be wrong. Adding one makes the web's catalogue fail to compile until it has words. */
export type HarnessFaultCode =
  | 'notJson'
  | 'tooLarge'
  /** Nested deeper than any plan is. */
  | 'tooDeep'
  | 'wrongFormat'
  | 'missing'
  | 'wrongType'
  | 'notAllowed'
  | 'empty'
  | 'notFinite'
  | 'negative'
  | 'notPositive'
  | 'notWhole'
  | 'duplicateId'
  | 'unknownReference'
  | 'noInlet'
  | 'severalInlets'
  | 'inletSeparable'
  | 'spliceSeparable'
  | 'runToItself'
  | 'runIntoInlet'
  | 'loop'
  | 'twoFeeds'
  | 'unreachable'
  | 'loadMissing'
  | 'loadWithoutFeed'
  | 'duplicateLoad'
  /** A run names the same circuit twice. */
  | 'duplicateCircuit'
  | 'lampWithoutData'
  | 'moduleWithoutData'
  | 'strayData';
