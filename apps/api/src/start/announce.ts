import type { AddressInfo } from 'node:net';
import type { NestExpressApplication } from '@nestjs/platform-express';
import type { Settings } from '../common/settings';
import { DemoAccountsService } from '../demo/demo-accounts.service';
import { FirstStartService } from '../demo/first-start.service';

/** Tells the console where the program answers and how to sign in. */
export async function announce(app: NestExpressApplication, settings: Settings): Promise<void> {
  const { port } = app.getHttpServer().address() as AddressInfo;
  const lines = [`Lampwright is ready at http://localhost:${port}`, `Data: ${settings.dataDir}`];
  const { firstLead } = app.get(FirstStartService);
  if (firstLead) {
    lines.push(
      'A first lead was created. This password is shown once; change it after signing in:',
      `  ${firstLead.email}  ${firstLead.password}`,
    );
  }
  const demo = await app.get(DemoAccountsService).read();
  if (demo.people.length > 0) {
    lines.push(
      `Demo accounts, password "${demo.password}":`,
      ...demo.people.map(({ email, name, role }) => `  ${email}  (${name}, ${role})`),
    );
  }
  if (settings.https && settings.trustProxy === false) {
    lines.push(
      'Behind a proxy? Set LAMPWRIGHT_TRUST_PROXY to the number of proxies, or all people share one address.',
    );
  }
  process.stdout.write(`${lines.join('\n')}\n`);
}
