import { StartError } from '../common/start-error';

/** Codes of failures that a person can do something about, and what. */
const ADVICE: Record<string, (error: NodeJS.ErrnoException & { port?: number }) => string> = {
  EADDRINUSE: ({ port }) =>
    `Port ${port} is taken by another program. Stop that program, or choose another port with PORT.`,
  EACCES: ({ port, message }) =>
    port === undefined
      ? `The program may not do what it must: ${message}.`
      : `The program may not open port ${port}. Choose one above 1023 with PORT.`,
  EROFS: ({ message }) =>
    `The disk is read-only: ${message}. Choose another data folder with LAMPWRIGHT_DATA.`,
  ENOSPC: ({ message }) => `The disk is full: ${message}.`,
  SQLITE_READONLY: () =>
    'The database may only be read. Check the rights of the data folder and its files.',
  SQLITE_CANTOPEN: () =>
    'The database cannot be opened. Check the rights of the data folder and its files.',
  SQLITE_NOTADB: () => 'The database file is damaged. Put a back-up in its place.',
  SQLITE_CORRUPT: () => 'The database file is damaged. Put a back-up in its place.',
  SQLITE_BUSY: () => 'Another program keeps the database locked. Stop it, then start again.',
};

/** One sentence for the console about why the program did not start; with the stack where nobody foresaw it. */
export function explainFailure(error: unknown): string {
  if (error instanceof StartError) return `Lampwright did not start. ${error.message}`;
  const code = String((error as { code?: unknown } | null)?.code);
  const advice = Object.hasOwn(ADVICE, code) ? ADVICE[code] : undefined;
  if (advice) return `Lampwright did not start. ${advice(error as NodeJS.ErrnoException)}`;
  const details = error instanceof Error ? (error.stack ?? error.message) : String(error);
  return `Lampwright did not start. ${details}`;
}
