import type { ProblemReason } from '@lampwright/contracts';
import type { RefusalReason } from '@lampwright/trace';

const problem = {
  validation: 'Something in the form is not right. The fields say what.',
  malformedJson: 'The server could not read what was sent. Load the page again and retry.',
  tooLarge: 'That is too large to send.',
  signInFailed: 'The e-mail or the password is not right.',
  notSignedIn: 'You are not signed in. Sign in and try again; nothing is lost.',
  sessionEnded: 'This device’s session was ended. Sign in again; nothing is lost.',
  accountClosed: 'This account is closed. A lead can reopen it.',
  notAllowed: 'Your role does not allow this. Ask a lead.',
  crossSite: 'The browser sent this from another site, so it was refused. Load the page again.',
  notFound: 'It is not there any more, or you may not see it.',
  methodNotAllowed: 'The server does not know how to do that. Load the page again.',
  conflict: 'Someone else changed this, or it is already taken. Load it again and look.',
  planFaults: 'The plan has faults, so it was not taken. They are listed below.',
  tankTrailer:
    'Tank trailers are not powered up with this program. A tank that is not certified clean and gas-free can hold vapour that a spark would light.',
  noPlan: 'This trailer has no plan yet, so there is nothing to narrow on. Give it a plan first.',
  lastLead: 'This is the last lead. Make someone else a lead first.',
  tooManyRequests: 'Too many tries in a short time. Wait a moment and try again.',
  timeout: 'The server took too long. Try again.',
  internal: 'The server failed. Try again; if it fails again, tell whoever keeps it.',
} as const satisfies Record<ProblemReason, string>;

const refusal = {
  notInThisStep: 'That does not belong to this step of the trace.',
  tankTrailer: 'A tank trailer is not powered up.',
  unknownCircuit: 'The plan has no such circuit.',
  unknownPoint: 'The plan has no such point.',
  unknownPlace: 'The plan has no such place.',
  unknownLamp: 'The plan has no such lamp on this circuit.',
  notSeparable: 'That part cannot be opened by hand.',
  barredPoint: 'You said that this point cannot be opened. Allow it again first.',
  notOpen: 'That point is not open.',
  unchangedState: 'Nothing changed since the last power-up, so it would only trip again.',
  coolDownNeeded: 'Too many hard trips in a row. Let the protection and the wires cool first.',
  contradictionOpen: 'The readings do not agree. Say first what that can mean.',
  cautionsLeft: 'There are cautions that are not ticked.',
  circuitsLeft: 'There are circuits that have no reading yet.',
  nothingChosen: 'No circuit is chosen.',
  pointsStillOpen: 'There are points that this trace left open.',
  repairNotEnergised: 'The repaired place was not under power, so this proves nothing.',
  lampsLeft: 'There are lamps that are not checked.',
  nothingToUndo: 'There is nothing to take back.',
  notTheLastEvent: 'Only the last thing can be taken back.',
  fixed: 'This trace is signed or abandoned and stays as it is.',
  outOfSequence: 'Something before this is missing on the server.',
  malformed: 'The server could not read this.',
} as const satisfies Record<RefusalReason, string>;

/** Complaints about single fields, by the code that the server gives. */
const field = {
  emailTaken: 'Another person has this e-mail.',
  unitTaken: 'Another trailer has this unit number.',
  unknownPlan: 'That plan is not there any more. Pick another.',
  wrongPassword: 'This is not your current password.',
  isEmail: 'This is not an e-mail address.',
} as const;

/** What the sentences about plan faults are put together from. */
const fault = {
  theFile: 'The file',
  pathAndId: '{{path}} (“{{id}}”)',
  quoted: '“{{value}}”',
  onCircuit: 'on circuit “{{circuit}}”',
  onNoCircuit: 'on any circuit',
  endOfText: 'its end',
  type: {
    array: 'a list',
    object: 'an object',
    string: 'text',
    number: 'a number',
    boolean: 'true or false',
    null: 'null',
  },
} as const;

export default {
  fault,
  problem,
  field,
  refusal,
  network: 'No answer from the server. Check the signal and try again; nothing is lost.',
  storage: 'This device did not keep the data. Free some space, then load the page again.',
  storageFull: 'This device is full. Free some space, then try again.',
  unknown: 'The program made a mistake here. Load the page again; what you typed is kept.',
  waitSeconds: 'Too many tries in a short time. Wait {{seconds}} s and try again.',
} as const;
