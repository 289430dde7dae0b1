import { EntityManager } from '@mikro-orm/better-sqlite';
import { startTestServer } from '../testing/test-server';

it('gives up a request that hangs', async () => {
  const server = await startTestServer({ requestTimeout: 50 });
  const connection = server.app.get(EntityManager).getConnection();
  jest.spyOn(connection, 'execute').mockReturnValueOnce(new Promise(() => undefined));
  const { body } = await server.client().get('/api/health').expect(503);
  expect(body.reason).toBe('timeout');
  await server.close();
});
