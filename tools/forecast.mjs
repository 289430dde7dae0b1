/** `npm run --silent forecast -- FILE...`: what traces on these plans will take, one JSON object a line. */
import { readFileSync } from 'node:fs';
import { resolve } from 'node:path';
import { Mistake, readOptions, usage } from './lib/forecast-options.mjs';
import { checkNode } from './lib/prepare.mjs';
import { giveUp, say } from './lib/say.mjs';
import { at } from './lib/workspace.mjs';

/** The libraries, straight from their sources. */
async function libraries() {
  const { runnerImport } = await import('vite').catch((error) => {
    if (error.code !== 'ERR_MODULE_NOT_FOUND') throw error;
    throw new Mistake('the packages are not installed.', 'Run npm ci and try again.');
  });
  const { alias } = (await runnerImport(at('tools/vitest.shared.mts'))).module;
  const load = async (name) =>
    (await runnerImport(at(`libs/${name}/src/index.ts`), { resolve: { alias } })).module;
  return { ...(await load('harness')), ...(await load('isolation')) };
}

/** Where the person stands; npm itself runs scripts at the root. */
const here =
  process.env.npm_lifecycle_event === 'forecast' ? (process.env.INIT_CWD ?? '.') : process.cwd();

function textIn(file) {
  try {
    return readFileSync(resolve(here, file), 'utf8');
  } catch (error) {
    throw new Mistake(`${file} cannot be read: ${error.code}.`, 'Name a file with a plan in it.');
  }
}

function planIn(file, text, { readHarnessText }) {
  const reading = readHarnessText(text);
  if (reading.ok) return reading.harness;
  throw new Mistake(
    `${file} is no plan that can be used.`,
    reading.faults.map((fault) => `  ${wordsOf(fault)}`).join('\n'),
  );
}

/** A fault as facts; the words for people are the web's. */
function wordsOf({ code, path, ...facts }) {
  const rest = Object.entries(facts).map(([name, value]) => `${name} ${JSON.stringify(value)}`);
  return [path || 'the document', code, ...rest].join(', ');
}

/** The circuits asked for, each as sections; without one named, those that have a point to open. */
function treesOf(file, harness, circuit, { sectionTree }) {
  const ids = harness.circuits.map(({ id }) => id);
  if (circuit !== undefined && !ids.includes(circuit)) {
    throw new Mistake(`${file} has no circuit "${circuit}".`, `It has ${ids.join(', ')}.`);
  }
  return ids
    .filter((id) => circuit === undefined || id === circuit)
    .map((id) => ({ circuit: id, tree: sectionTree(harness, id) }))
    .filter(({ tree }) => circuit !== undefined || tree.sections.length > 1);
}

const rounded = (_, value) => (typeof value === 'number' ? Number(value.toFixed(6)) : value);

async function main() {
  const options = readOptions(process.argv.slice(2));
  if (options.help) return say(usage);
  const texts = options.files.map((file) => ({ file, text: textIn(file) }));
  const tools = await libraries();
  // All of it is looked over before anything is printed.
  const plans = texts.map(({ file, text }) => ({ file, harness: planIn(file, text, tools) }));
  const jobs = plans.flatMap(({ file, harness }) =>
    treesOf(file, harness, options.circuit, tools).map((job) => ({ file, ...job })),
  );
  const timing = { ...tools.DEFAULT_TIMING, ...options.timing };
  const clock = () => performance.now();
  for (const { file, circuit, tree } of jobs) {
    const { planner, hunt } = options;
    const { deciles, ...report } = tools.forecastReport(tree, { timing, planner, hunt, clock });
    const line = { file, circuit, ...report, ...(options.deciles && { deciles }) };
    say(JSON.stringify(line, rounded));
  }
}

checkNode();
// A reader like `head` closes the pipe once it has seen enough.
process.stdout.on('error', (error) => process.exit(error.code === 'EPIPE' ? 0 : 1));
try {
  await main();
} catch (error) {
  if (!(error instanceof Mistake)) throw error;
  giveUp(error.message, error.remedy);
}
