import { parseArgs } from 'node:util';

/** A mistake in what was asked for: what is wrong, and what to do about it. */
export class Mistake extends Error {
  constructor(what, remedy) {
    super(what);
    this.remedy = remedy;
  }
}

export const usage = `npm run --silent forecast -- FILE... [options]

Plays the planner against every section of every circuit as the hidden short, and prints one JSON object a line.

  --circuit ID                  this circuit alone; default: each one with a point to open
  --at-hand                     power is switched from where the person works: no walking
  --power-seconds N             one power-up (15)
  --walk-seconds-per-metre N    (1)
  --overload-seconds N          what an overload costs on top (0)
  --faults N                    1, 2 or 3 shorts at once (1); plays random traces
  --detect P                    probability that a short shows in one power-up, above 0 up to 1 (1); plays random traces
  --samples N                   random traces (1000)
  --seed N                      of the random traces (1)
  --budget MS                   how long a decision may be thought about, roughly (72)
  --deciles                     adds how sure and how right the namings of random traces were, in ten groups`;

/**
 * Thinking is counted in steps, so that answers do not depend on the machine. So many take at most about a millisecond;
 * the planner's own default of 18,000 steps stands for 72 ms.
 */
const STEPS_PER_MILLISECOND = 250;

const options = {
  circuit: { type: 'string' },
  'at-hand': { type: 'boolean' },
  'power-seconds': { type: 'string' },
  'walk-seconds-per-metre': { type: 'string' },
  'overload-seconds': { type: 'string' },
  faults: { type: 'string' },
  detect: { type: 'string' },
  samples: { type: 'string' },
  seed: { type: 'string' },
  budget: { type: 'string' },
  deciles: { type: 'boolean' },
  help: { type: 'boolean' },
};

/** What the command line asks for. Throws a `Mistake` that names the option. */
export function readOptions(args) {
  const { values, positionals: files } = parse(args);
  if (values.help) return { help: true };
  if (files.length === 0) throw new Mistake('no plan was named.', usage);
  if (values['at-hand'] && values['walk-seconds-per-metre'] !== undefined) {
    throw new Mistake(
      '--at-hand and --walk-seconds-per-metre exclude each other.',
      'Power at hand takes no walking; leave one of them out.',
    );
  }
  const number = (name, test, wanted) => numberOf(values, name, test, wanted);
  const seconds = (name) => number(name, (n) => n >= 0, 'a number of seconds, 0 or more');
  const faults = number('faults', (n) => [1, 2, 3].includes(n), '1, 2 or 3');
  const detection = number('detect', (n) => n > 0 && n <= 1, 'a probability above 0, up to 1');
  const samples = number(
    'samples',
    (n) => Number.isSafeInteger(n) && n > 0,
    'a whole number above 0',
  );
  const seed = number(
    'seed',
    (n) => Number.isSafeInteger(n) && n >= 0,
    'a whole number, 0 or more',
  );
  const budget = number('budget', (n) => n > 0, 'a number of milliseconds above 0');
  return {
    files,
    circuit: values.circuit,
    deciles: values.deciles ?? false,
    timing: defined({
      powerSeconds: seconds('power-seconds'),
      walkSecondsPerMetre: values['at-hand'] ? 0 : seconds('walk-seconds-per-metre'),
      overloadSeconds: seconds('overload-seconds'),
    }),
    planner: budget === undefined ? {} : { steps: Math.ceil(budget * STEPS_PER_MILLISECOND) },
    hunt:
      faults === undefined && detection === undefined
        ? undefined
        : defined({ faults, detection, samples, seed }),
  };
}

function parse(args) {
  try {
    return parseArgs({ args, options, allowPositionals: true });
  } catch (error) {
    if (!String(error.code).startsWith('ERR_PARSE_ARGS')) throw error;
    // The first sentence names the option; what follows speaks to programmers.
    throw new Mistake(`${error.message.split(/\. |\n/)[0].replace(/\.$/, '')}.`, usage);
  }
}

function numberOf(values, name, test, wanted) {
  const text = values[name];
  if (text === undefined) return undefined;
  const number = text.trim() === '' ? NaN : Number(text);
  if (Number.isFinite(number) && test(number)) return number;
  throw new Mistake(`--${name} is "${text}".`, `It must be ${wanted}.`);
}

const defined = (object) =>
  Object.fromEntries(Object.entries(object).filter(([, value]) => value !== undefined));
