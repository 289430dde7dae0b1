import { isFlag, isText, listOf, oneOf, orNull, readAs, shapeOf } from '../../store/guards';
import type { FeedDraft } from '../feed-choice';

/** What has been said so far of the complaint and the feed. */
export interface IntakeDraft extends FeedDraft {
  complaint: string | null;
  words: string;
  circuits: string[];
}

export const emptyIntake: IntakeDraft = {
  complaint: null,
  words: '',
  circuits: [],
  feedKind: null,
  breakerType: null,
  atHand: null,
};

export const readIntakeDraft = readAs(
  shapeOf<IntakeDraft>({
    complaint: orNull(isText),
    words: isText,
    circuits: listOf(isText),
    feedKind: orNull(oneOf('seriesLamp', 'tester', 'breaker', 'fuse', 'ohmmeter')),
    breakerType: orNull(oneOf(1, 2, 3)),
    atHand: orNull(isFlag),
  }),
);
