export { arbitraryHarness } from './arbitraryHarness';
export type { ArbitraryHarnessOptions } from './arbitraryHarness';
export { exactCases, largeCases } from './planCases';
export type { CaseExpectation, CaseSetting, PlanCase } from './planCases';
export { chain, CIRCUIT, star } from './plans';
export { goodPlan } from './malformed/goodPlan';
export type { MalformedPlan } from './malformed/damage';
export { malformedPlans } from './malformed/malformedPlans';
