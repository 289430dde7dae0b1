import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { demoYard } from '@lampwright/demo';
import request from 'supertest';
import { readSettings, type Settings } from '../common/settings';
import { createApp } from '../create-app';
import { DEMO_PASSWORD } from '../demo/demo-password';

/** The people of the demo yard that tests sign in as. */
export const LEAD = 'maren@thornwick-yard.example';
export const TECHNICIAN = 'ruben@thornwick-yard.example';
export const OTHER_TECHNICIAN = 'ines@thornwick-yard.example';
export const TRAINEE = 'joss@thornwick-yard.example';

export type Agent = ReturnType<typeof request.agent>;

/** A real server on a real database file, in a folder of its own. */
export interface TestServer {
  app: NestExpressApplication;
  settings: Settings;
  /** A client without cookies. */
  client(): Agent;
  /** A client that is signed in. */
  signedIn(email: string): Promise<Agent>;
  close(): Promise<void>;
}

/** Passport keeps its strategies for the whole process, so only the server started last can tell who is signed in. */
export async function startTestServer(change: Partial<Settings> = {}): Promise<TestServer> {
  const dataDir = change.dataDir ?? mkdtempSync(join(tmpdir(), 'lampwright-'));
  const settings: Settings = {
    ...readSettings({}),
    dataDir,
    webDir: join(dataDir, 'web'),
    demo: 'yard',
    logLevel: 'silent',
    requestsPerMinute: 100_000,
    ...change,
  };
  const app = await createApp(settings);
  await app.listen(0);
  const client = () => request.agent(app.getHttpServer()).set('X-Lampwright', '1');
  return {
    app,
    settings,
    client,
    async signedIn(email) {
      const agent = client();
      await agent.post('/api/auth/sign-in').send({ email, password: DEMO_PASSWORD }).expect(200);
      return agent;
    },
    async close() {
      await app.close();
      rmSync(dataDir, { recursive: true, force: true });
    },
  };
}

/** The id of somebody of the demo yard. */
export function personId(email: string): string {
  return demoYard.people.find((person) => person.email === email)!.id;
}

/** The id of a trailer of the demo yard, by its unit number. */
export function trailerId(unit: string): string {
  return demoYard.trailers.find((trailer) => trailer.unit === unit)!.id;
}
