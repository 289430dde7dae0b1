import { spawnSync } from 'node:child_process';
import { accessSync, constants, mkdirSync } from 'node:fs';
import { giveUp, say } from './say.mjs';
import { at, root, textOf } from './workspace.mjs';

/** Ends with a message where Node.js is older than package.json's `engines` asks for. */
export function checkNode(version = process.versions.node) {
  const wanted = JSON.parse(textOf('package.json')).engines.node.replace('>=', '');
  const [major, minor] = version.split('.').map(Number);
  const [wantedMajor, wantedMinor] = wanted.split('.').map(Number);
  if (major > wantedMajor || (major === wantedMajor && minor >= wantedMinor)) return;
  giveUp(
    `Node.js ${version} is too old.`,
    `Install Node.js ${wanted} or newer and run the command again.`,
  );
}

/** Ends with a message where a folder cannot be made or written. */
export function checkWritable(folder, purpose) {
  try {
    mkdirSync(folder, { recursive: true });
    accessSync(folder, constants.W_OK);
  } catch (error) {
    giveUp(
      `${purpose} (${folder}) cannot be written: ${error.code ?? error.message}.`,
      'Free the disk or mount it for writing, or name another folder, then run the command again.',
    );
  }
}

/** Runs a command of the workspace with its output shown; answers whether it ended well. */
export function run(command, args, env = {}) {
  const { status, error } = spawnSync(command, args, {
    cwd: root,
    stdio: 'inherit',
    env: { ...process.env, ...env },
  });
  if (error) say(`${command}: ${error.message}`);
  return status === 0;
}

/** Whether node_modules holds every package of the lock file in its version, by npm's own record of what it put there. */
function isInstalled() {
  const record = textOf('node_modules/.package-lock.json');
  if (!record) return false;
  const there = JSON.parse(record).packages;
  const wanted = JSON.parse(textOf('package-lock.json')).packages;
  return Object.entries(wanted).every(
    ([path, { version, optional }]) => path === '' || optional || there[path]?.version === version,
  );
}

/** Installs what the lock file says, if that is not what is there. */
export function install() {
  if (isInstalled()) return;
  checkWritable(at('.'), 'The workspace');
  say(
    'Installing packages. The database driver is compiled on the way: this takes 2 to 5 minutes, once.',
  );
  if (run('npm', ['ci', '--no-audit', '--no-fund'])) return;
  giveUp(
    'The packages could not be installed.',
    'The lines above say why. Compiling the database driver wants python3, make and a C++ compiler.',
  );
}
