export { ANOTHER_SHORT_FACTOR, believe } from './belief';
export { closingSeconds, pointsOf, powerUpSeconds } from './costs';
export { DEFAULT_TIMING } from './timing';
export type * from './types';
