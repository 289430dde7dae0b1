import { spawnSync } from 'node:child_process';
import { existsSync } from 'node:fs';
import { run } from './prepare.mjs';
import { giveUp, say } from './say.mjs';

const candidates = () =>
  [process.env.CHROMIUM_PATH, '/usr/bin/chromium', '/usr/bin/chromium-browser'].filter(Boolean);

const found = () => candidates().find((path) => existsSync(path));

/** Path of a Chromium for the browser tests; gets Debian's where there is none. */
export function chromium() {
  const path = found();
  if (path) return path;
  const canInstall =
    process.getuid?.() === 0 &&
    spawnSync('apt-get', ['--version'], { stdio: 'ignore' }).status === 0;
  if (canInstall) {
    say('Installing Chromium for the browser tests: 1 to 2 minutes, once.');
    const quiet = { DEBIAN_FRONTEND: 'noninteractive' };
    run('apt-get', ['update', '-qq'], quiet);
    run('apt-get', ['install', '-y', '-qq', '--no-install-recommends', 'chromium'], quiet);
  }
  return (
    found() ??
    giveUp(
      'The browser tests need Chromium.',
      'Install the package "chromium", or name one: CHROMIUM_PATH=/path/to/chromium npm test',
    )
  );
}
