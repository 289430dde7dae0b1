import { applies } from './adapters';
import * as beginning from './changes/beginning';
import * as ending from './changes/ending';
import { explain } from './changes/explaining';
import * as mending from './changes/mending';
import * as narrowing from './changes/narrowing';

/** The machine's actions: each is a change of what is known. */
export const actions = {
  state: applies('intake.stated', beginning.state),
  tick: applies('caution.ticked', beginning.tick),
  confirm: applies('circuit.confirmed', beginning.confirm),
  beginNarrowing: applies('confirm.finished', beginning.beginNarrowing),
  wiggle: applies('wiggle.read', beginning.wiggle),
  beginAfterWiggle: applies('wiggle.read', beginning.beginAfterWiggle),
  changeFeed: applies('feed.changed', beginning.changeFeed),
  coolDown: applies('coolDown.taken', beginning.coolDown),
  chooseCircuit: applies('circuit.chosen', narrowing.chooseCircuit),
  barPoint: applies('point.barred', narrowing.barPoint),
  allowPoint: applies('point.allowed', narrowing.allowPoint),
  noteDamage: applies('damage.seen', narrowing.noteDamage),
  choosePowerUp: applies('powerUp.chosen', narrowing.choosePowerUp),
  takeReading: applies('reading.taken', narrowing.takeReading),
  explain: applies('contradiction.explained', explain),
  inspect: applies('place.inspected', mending.inspect),
  resume: applies('narrowing.resumed', mending.resume),
  repair: applies('repair.made', mending.repair),
  prove: applies('proof.read', mending.prove),
  reconnect: applies('point.reconnected', mending.reconnect),
  power: applies('circuit.powered', ending.power),
  checkLamp: applies('lamp.checked', ending.checkLamp),
  lightAll: applies('circuit.allLit', ending.lightAll),
  sign: applies('trace.signed', ending.sign),
};
