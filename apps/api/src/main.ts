import 'reflect-metadata';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { readSettings } from './common/settings';
import { createApp } from './create-app';
import { announce } from './start/announce';
import { assertNodeVersion, assertWritable } from './start/preconditions';
import { explainFailure } from './start/explain-failure';

async function start(): Promise<void> {
  assertNodeVersion(process.versions.node);
  const settings = readSettings(process.env);
  assertWritable(settings.dataDir);
  const app = await createApp(settings);
  await app.listen(settings.port);
  endOnSignals(app);
  await announce(app, settings);
}

/** Nest closes the application on a signal and then repeats the signal, which Node answers with an error code. */
function endOnSignals(app: NestExpressApplication): void {
  for (const signal of ['SIGINT', 'SIGTERM'] as const) {
    process.once(signal, () => {
      app.close().then(
        () => process.exit(0),
        (error: unknown) => fail(error),
      );
    });
  }
}

function fail(error: unknown): void {
  process.stderr.write(`${explainFailure(error)}\n`);
  process.exit(1);
}

start().catch(fail);
