/** `npm start`: installs, builds what changed, and serves web and API on one port. */
import { spawn } from 'node:child_process';
import { existsSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { resolve } from 'node:path';
import { checkNode, checkWritable, install, run } from './lib/prepare.mjs';
import { giveUp, say } from './lib/say.mjs';
import { at, fingerprint, root, textOf } from './lib/workspace.mjs';

const entry = 'dist/apps/api/apps/api/src/main.js';
const buildStamp = 'dist/.built';

function build() {
  const now = fingerprint();
  if (existsSync(at(entry)) && textOf(buildStamp) === now) return;
  checkWritable(at('dist'), 'The build folder');
  say('Building web and API.');
  if (!run('npx', ['nx', 'run-many', '-t', 'build', '--output-style=static'])) {
    giveUp('The build failed.', 'The lines above say where.');
  }
  writeFileSync(at(buildStamp), now);
}

/** Asked before the install and the build, which would be minutes spent for nothing. */
function checkPort(port) {
  return new Promise((free) => {
    const probe = createServer();
    probe.once('error', (error) => {
      giveUp(
        `Port ${port} cannot be used: ${error.code === 'EADDRINUSE' ? 'another program has it' : error.message}.`,
        `End that program, or choose another port: PORT=${port + 1} npm start`,
      );
    });
    probe.listen(port, () => probe.close(free));
  });
}

function portFromEnvironment() {
  const text = process.env.PORT ?? '3000';
  const port = Number(text);
  if (Number.isInteger(port) && port > 0 && port < 65_536) return port;
  return giveUp(
    `PORT is "${text}".`,
    'Give a whole number from 1 to 65535, or leave it out for 3000.',
  );
}

checkNode();
const port = portFromEnvironment();
checkWritable(resolve(root, process.env.LAMPWRIGHT_DATA ?? 'var'), 'The data folder');
await checkPort(port);
install();
build();

const server = spawn(process.execPath, ['--enable-source-maps', at(entry)], {
  cwd: root,
  stdio: 'inherit',
  env: { NODE_ENV: 'production', ...process.env },
});
for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => server.kill(signal));
server.on('exit', (code) => process.exit(code ?? 1));
