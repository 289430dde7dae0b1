import { isNumber, isText, listOf, orNull, readAs, shapeOf } from '../../store/guards';

interface PartUsed {
  name: string;
  quantity: number;
}

/** What has been said so far of a repair. */
export interface RepairDraft {
  /** Ids of the short lists; `other` for own words. */
  cause: string | null;
  causeWords: string;
  correction: string | null;
  correctionWords: string;
  parts: PartUsed[];
  note: string;
}

export const emptyRepair: RepairDraft = {
  cause: null,
  causeWords: '',
  correction: null,
  correctionWords: '',
  parts: [],
  note: '',
};

export const readRepairDraft = readAs(
  shapeOf<RepairDraft>({
    cause: orNull(isText),
    causeWords: isText,
    correction: orNull(isText),
    correctionWords: isText,
    parts: listOf(shapeOf<PartUsed>({ name: isText, quantity: isNumber })),
    note: isText,
  }),
);
