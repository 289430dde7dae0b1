/** The screens of one decision: the power-up itself, and what can be said instead of doing it. */
export type NarrowMode = 'powerUp' | 'bar' | 'pick' | 'else' | 'plan' | 'damage' | 'feed';
