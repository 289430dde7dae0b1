import type { Preferences } from '@lampwright/contracts';

/** What a new account begins with. */
export const DEFAULT_PREFERENCES: Preferences = { lengths: 'feet', theme: 'system' };
