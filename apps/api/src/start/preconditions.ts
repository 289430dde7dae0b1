import { accessSync, constants, mkdirSync } from 'node:fs';

import { StartError } from '../common/start-error';

const MINIMUM_NODE = [20, 19] as const;

/** @throws StartError when Node is too old. */
export function assertNodeVersion(version: string): void {
  const [major = 0, minor = 0] = version.split('.').map(Number);
  const [needMajor, needMinor] = MINIMUM_NODE;
  if (major > needMajor || (major === needMajor && minor >= needMinor)) return;
  throw new StartError(
    `Node.js ${version} is too old. Lampwright needs ${MINIMUM_NODE.join('.')} or newer.`,
  );
}

/** Makes the data folder where it is missing. @throws StartError when it cannot be written. */
export function assertWritable(folder: string): void {
  try {
    mkdirSync(folder, { recursive: true });
    accessSync(folder, constants.W_OK);
  } catch (error) {
    throw new StartError(
      `The data folder ${folder} cannot be written (${error instanceof Error ? error.message : String(error)}). ` +
        'Give the program the right to, or choose another folder with LAMPWRIGHT_DATA.',
    );
  }
}
