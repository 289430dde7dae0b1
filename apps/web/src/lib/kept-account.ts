import type { AccountDto } from '@lampwright/contracts';
import { storage, StorageError } from './storage';

const KEY = 'account';

function isAccount(kept: unknown): kept is AccountDto {
  return (
    typeof kept === 'object' &&
    kept !== null &&
    'id' in kept &&
    'preferences' in kept &&
    'permissions' in kept &&
    Array.isArray(kept.permissions)
  );
}

/** Without storage a person is simply asked again; nothing else hangs on it. */
async function tolerant<T>(work: Promise<T>, otherwise: T): Promise<T> {
  try {
    return await work;
  } catch (error) {
    if (error instanceof StorageError) return otherwise;
    throw error;
  }
}

/** Who was signed in last on this device, so that a yard without signal does not ask for a password. */
export const keptAccount = {
  read: async (): Promise<AccountDto | null> => {
    const kept = await tolerant(storage.read(KEY), null);
    return isAccount(kept) ? kept : null;
  },
  write: (account: AccountDto) => tolerant(storage.write(KEY, account), undefined),
  forget: () => tolerant(storage.remove(KEY), undefined),
};
