import { allows, where } from './adapters';
import { showsFault } from './changes/beginning';
import { circuitsToProve } from './circuits';
import { coolDownDue, isOverload } from './feeds';
import * as beginning from './rules/beginning';
import * as ending from './rules/ending';
import * as narrowing from './rules/narrowing';
import { knownSectionOf } from './situation';
import type { TraceContext } from './state';

const isKnown = (context: TraceContext) => knownSectionOf(context) !== null;
const isProven = (context: TraceContext) => circuitsToProve(context).length === 0;
const nothingOpen = (context: TraceContext) => context.open.length === 0;

/** The machine's guards: each is a rule, or a rule and what the event says. */
export const guards = {
  mayState: allows('intake.stated', beginning.ruleForStatement),
  mayTick: allows('caution.ticked', beginning.ruleForTick),
  maySetOut: allows('safety.confirmed', beginning.ruleForSafety),
  mayConfirm: allows('circuit.confirmed', beginning.ruleForConfirming),
  faultConfirmed: allows('confirm.finished', beginning.ruleForConfirmed, (_, context) =>
    showsFault(context),
  ),
  nothingConfirmed: allows('confirm.finished', beginning.ruleForConfirmed),
  wiggleShows: allows('wiggle.read', beginning.ruleForWiggle, (event) => isOverload(event.outcome)),
  mayWiggle: allows('wiggle.read', beginning.ruleForWiggle),
  mayChangeFeed: allows('feed.changed', beginning.ruleForFeed),
  mayAbandon: allows('trace.abandoned', beginning.ruleForAbandoning),
  mayChooseCircuit: allows('circuit.chosen', narrowing.ruleForCircuit),
  mayBar: allows('point.barred', narrowing.ruleForBarring),
  mayAllow: allows('point.allowed', narrowing.ruleForAllowing),
  mayNoteDamage: allows('damage.seen', narrowing.ruleForDamage),
  mayChoosePowerUp: allows('powerUp.chosen', narrowing.ruleForChoice),
  mayRead: allows('reading.taken', narrowing.ruleForReading),
  wasHandled: allows(
    'contradiction.explained',
    narrowing.ruleForExplanation,
    (event) => event.meaning === 'repairedByHandling',
  ),
  mayExplain: allows('contradiction.explained', narrowing.ruleForExplanation),
  isContradicted: where((context) => context.contradiction !== null),
  isExplained: where((context) => context.contradiction === null),
  isKnown: where(isKnown),
  isHot: where(coolDownDue),
  isCool: where((context) => !coolDownDue(context)),
  isFound: allows(
    'place.inspected',
    narrowing.ruleForInspecting,
    (event) => event.finding === 'found',
  ),
  mayInspect: allows('place.inspected', narrowing.ruleForInspecting),
  mayResume: allows('narrowing.resumed', narrowing.ruleForResuming),
  mayRepair: allows('repair.made', ending.ruleForRepair),
  proofFails: allows('proof.read', ending.ruleForProof, (event) => isOverload(event.outcome)),
  mayProve: allows('proof.read', ending.ruleForProof),
  provenAndClosed: where((context) => isProven(context) && nothingOpen(context)),
  isProven: where(isProven),
  mayReconnect: allows('point.reconnected', ending.ruleForReconnecting),
  allClosed: where(nothingOpen),
  stillOverloads: allows('circuit.powered', ending.ruleForPowering, (event) =>
    isOverload(event.outcome),
  ),
  mayPower: allows('circuit.powered', ending.ruleForPowering),
  mayCheckLamp: allows('lamp.checked', ending.ruleForLampResult),
  mayLightAll: allows('circuit.allLit', ending.ruleForAllLit),
  lampsChecked: allows('lampCheck.finished', ending.ruleForLampCheck),
  maySign: allows('trace.signed', ending.ruleForSignature),
};
