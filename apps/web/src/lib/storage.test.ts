import { fakeIndexedDb } from '../testing/fake-indexed-db';
import { storage, StorageError } from './storage';

describe('storage', () => {
  it('keeps a value and forgets it', async () => {
    await storage.write('draft:a', { unit: 'T-118' });
    await expect(storage.read('draft:a')).resolves.toEqual({ unit: 'T-118' });
    await storage.remove('draft:a');
    await expect(storage.read('draft:a')).resolves.toBeUndefined();
  });

  it('lists the keys of one kind', async () => {
    await storage.write('draft:a', 1);
    await storage.write('trace:b', 2);
    await expect(storage.keys('draft:')).resolves.toEqual(['draft:a']);
  });

  it('changes a value in one transaction', async () => {
    await storage.write('count', 1);
    await storage.update('count', (old) => Number(old) + 1);
    await expect(storage.read('count')).resolves.toBe(2);
  });

  it('opens anew and tries once more when the system cut the connection', async () => {
    await storage.write('draft:a', 'before');
    const opened = fakeIndexedDb.opened();
    fakeIndexedDb.failNext(1);
    await storage.write('draft:a', 'after');
    await expect(storage.read('draft:a')).resolves.toBe('after');
    expect(fakeIndexedDb.opened()).toBe(opened + 1);
  });

  it('says so when the second try fails too, and works again later', async () => {
    fakeIndexedDb.failNext(2);
    await expect(storage.write('draft:a', 1)).rejects.toThrow(StorageError);
    await expect(storage.write('draft:a', 2)).resolves.toBeUndefined();
  });
});
