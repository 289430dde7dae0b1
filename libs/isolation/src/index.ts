export { adviceFor } from './adviceFor';
export type { Alternative } from './alternatives';
export { after } from './after';
export { ANOTHER_SHORT_FACTOR, believe } from './belief';
export { closingSeconds, pointsOf, powerUpSeconds } from './costs';
export { MISREAD } from './electrical/againstBest';
export { DEFAULT_AMMETER } from './electrical/ammeter';
export type { Ammeter, AmpsRange } from './electrical/ammeter';
export { ampsLikelihood } from './electrical/ampsLikelihood';
export type { AmpsLikelihoodOptions } from './electrical/ampsLikelihood';
export { ampsVerdict } from './electrical/ampsVerdict';
export type { AmpsVerdict, AmpsVerdictOptions } from './electrical/ampsVerdict';
export { ASSUMED_CONDUCTOR, conductorOhms } from './electrical/conductors';
export type { ConductorOhms } from './electrical/conductors';
export { CONTACT_OF_OVERLOAD, CONTACT_UNDER_POWER } from './electrical/contact';
export type { ContactOhms } from './electrical/contact';
export { ohmsAt } from './electrical/copper';
export type { DarkFit } from './electrical/darkFits';
export { distanceToShort, murrayLoop } from './electrical/distanceToShort';
export type { ReturnPath } from './electrical/distanceToShort';
export { expectedLoad } from './electrical/expectedLoad';
export type { AmpsBand, ExpectedLoad, LoadOptions } from './electrical/expectedLoad';
export { faultFacts } from './electrical/faultFacts';
export type { FaultFacts, RunUnderFault } from './electrical/faultFacts';
export type { Feeding } from './electrical/feeding';
export { circularMils, onderdonkAmps, PREECE, preeceAmps } from './electrical/fusing';
export {
  ADIABATIC_SECONDS,
  adiabaticK,
  adiabaticMm2,
  ALUMINIUM,
  celsiusAfter,
  COPPER,
  PVC_K,
  withstand,
} from './electrical/heating';
export type { Metal } from './electrical/heating';
export { LAMP_BANDS } from './electrical/lampBand';
export type { Band, LampBands } from './electrical/lampBand';
export { COLD_FILAMENT } from './electrical/loads';
export type { MeterPoint } from './electrical/meterView';
export { DEFAULT_OHMMETER } from './electrical/ohmmeter';
export type { Ohmmeter, OhmsRange, OhmsReading } from './electrical/ohmmeter';
export { ohmsEvidence } from './electrical/ohmsEvidence';
export type { OhmsEvidence, OhmsQuestion } from './electrical/ohmsEvidence';
export type { PlaceFit } from './electrical/placesThatFit';
export { reweigh } from './electrical/reweigh';
export { solveCircuit } from './electrical/solveCircuit';
export type { CircuitSolution, Short, SolveOptions } from './electrical/solveCircuit';
export { hotLength, loadedCelsius, voltageDrop } from './electrical/voltageDrop';
export { UnknownSpotError } from './electrical/wiring';
export type { Spot } from './electrical/wiring';
export { explain } from './explain';
export type { Aftermath, Explanation, KnownFacts, PowerUpFacts } from './explain';
export { firstQuestion, forecast } from './forecast';
export type { Forecast } from './forecast';
export type { Calibration } from './forecastDeciles';
export { forecastReport } from './forecastReport';
export type { ForecastReport, ReportOptions } from './forecastReport';
export type { SampleOptions } from './forecastSamples';
export { easiestFirstSeconds, halfByCountSeconds } from './habits';
export { drawShorts } from './play/drawShorts';
export { playHunt } from './play/playHunt';
export type { Naming, PlayedHunt } from './play/playHunt';
export { seededRandom } from './play/seededRandom';
export { SimulatedTrailer } from './play/SimulatedTrailer';
export { createPlanner, plan, QUICK_STEPS, THOROUGH_STEPS } from './planner';
export type { PlannerOptions } from './planner';
export { DEFAULT_TIMING } from './timing';
export type * from './types';
export { beliefIn } from './uncertain/beliefIn';
export { createHuntPlanner } from './uncertain/createHuntPlanner';
export { STOPS_AT } from './uncertain/standing';
