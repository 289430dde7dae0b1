import { isNumber, isText, orNull, readAs, shapeOf } from '../../store/guards';

/** What was changed before signing; `null` where what the record says still stands. */
export interface SignDraft {
  name: string | null;
  cause: string | null;
  correction: string | null;
  minutes: number | null;
}

export const untouched: SignDraft = { name: null, cause: null, correction: null, minutes: null };

export const readSignDraft = readAs(
  shapeOf<SignDraft>({
    name: orNull(isText),
    cause: orNull(isText),
    correction: orNull(isText),
    minutes: orNull(isNumber),
  }),
);
