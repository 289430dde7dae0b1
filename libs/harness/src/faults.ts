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
  /** Further ids that a person needs to see: the parts of a loop, the two feeds of a part. */
  others?: string[];
}

/** Every way in which a document can be wrong. Adding one makes the web's catalogue fail to compile until it has words. */
export type HarnessFaultCode =
  | 'notJson'
  | 'tooLarge'
  | 'wrongFormat'
  | 'missing'
  | 'wrongType'
  | 'notAllowed'
  | 'empty'
  | 'notFinite'
  | 'negative'
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
  | 'lampWithoutData'
  | 'moduleWithoutData'
  | 'strayData';
