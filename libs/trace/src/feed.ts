/** What feeds power during a trace, and how its protection behaves. */
export type FeedKind = 'seriesLamp' | 'tester' | 'breaker' | 'fuse' | 'ohmmeter';

/** SAE J553 breaker types: 1 closes by itself, 2 stays open until the supply is switched off, 3 is reset by hand. */
export type BreakerType = 1 | 2 | 3;

export interface Feed {
  kind: FeedKind;
  /** Only for `breaker`. */
  breakerType?: BreakerType;
  /** True where power is switched from where the person works: walking then costs nothing. */
  atHand: boolean;
}
