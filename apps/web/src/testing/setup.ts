import '../i18n/i18n';
import { fakeIndexedDb } from './fake-indexed-db';

beforeEach(() => {
  fakeIndexedDb.reset();
  vi.stubGlobal('indexedDB', fakeIndexedDb.factory);
});
