/** A start-up failure that a person can do something about; its message says what. */
export class StartError extends Error {}
