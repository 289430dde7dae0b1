import { closingSeconds, powerUpSeconds } from '../costs';
import type { Hunt, HuntPlanner } from '../types';
import type { SimulatedTrailer } from './SimulatedTrailer';

/** Where a planner said that a short is: one section, or one of several that nothing in reach parts. */
export interface Naming {
  sections: number[];
  /** How sure it was. */
  confidence: number;
  right: boolean;
}

/** How a hunt went. */
export interface PlayedHunt {
  /** All that the plan takes: handling, walks, power-ups, and closing everything at the end. Inspecting is not counted. */
  seconds: number;
  powerUps: number;
  repeats: number;
  /** Whether every power-up was proven the best one. */
  optimal: boolean;
  namings: Naming[];
  /** Sections that were still short at the end. */
  missed: number[];
  /** False where the play was broken off: readings contradicted each other, or the power-ups ran out. */
  finished: boolean;
  /** The hunt at its end, with all its readings. */
  hunt: Hunt;
}

/** A hunt that takes more than this is lost. */
const MOST_POWER_UPS = 500;

/**
 * Plays a planner against a trailer until it says that all is found: each section that it names is looked over, a short
 * there is mended, and the hunt goes on with what is known. A hunt that believes in a single short ends with the first
 * one mended. Same trailer, same play.
 */
export function playHunt(start: Hunt, trailer: SimulatedTrailer, planner: HuntPlanner): PlayedHunt {
  const played: PlayedHunt = {
    seconds: 0,
    powerUps: 0,
    repeats: 0,
    optimal: true,
    namings: [],
    missed: [],
    finished: false,
    hunt: start,
  };
  for (;;) {
    const { hunt } = played;
    const plan = planner.plan(hunt);
    if (plan.kind === 'contradicted' || played.powerUps >= MOST_POWER_UPS) break;
    if (plan.kind === 'clear') {
      played.finished = true;
      break;
    }
    if (plan.kind === 'found') {
      const { sections, confidence } = plan;
      const short = sections.find((section) => trailer.isShort(section));
      played.namings.push({ sections, confidence, right: short !== undefined });
      if (short !== undefined) trailer.mend(short);
      played.hunt = short === undefined ? lookedOver(hunt, sections) : mended(hunt, short);
      continue;
    }
    const { open, repeats, proof } = plan.advice;
    const outcome = trailer.powerUp(open);
    played.seconds += powerUpSeconds(hunt.tree, hunt.open, open, hunt.timing, hunt.elsewhere)[
      outcome
    ];
    played.powerUps += 1;
    if (repeats) played.repeats += 1;
    played.optimal &&= proof === 'optimal';
    played.hunt = { ...hunt, open, readings: [...hunt.readings, { open, outcome }] };
  }
  const { tree, open, timing, elsewhere } = played.hunt;
  played.seconds += closingSeconds(tree, open, timing, elsewhere);
  played.missed = trailer.left();
  return played;
}

function mended(hunt: Hunt, section: number): Hunt {
  const mend = { section, after: hunt.readings.length };
  return { ...hunt, mended: [...(hunt.mended ?? []), mend] };
}

function lookedOver(hunt: Hunt, sections: readonly number[]): Hunt {
  return { ...hunt, lookedOver: [...(hunt.lookedOver ?? []), ...sections] };
}
