import { demoYard } from '../demoYard';

/** Every trailer of the yard with the plan that it is wired by. */
export const fleet = demoYard.trailers.map((trailer) => {
  const plan = demoYard.plans.find(({ id }) => id === trailer.planId);
  if (!plan) throw new Error(`${trailer.unit} has no plan`);
  return { unit: trailer.unit, trailer, harness: plan.harness };
});

/** Every circuit of every trailer. */
export const fleetCircuits = fleet.flatMap((wired) =>
  wired.harness.circuits.map(({ id }) => ({ ...wired, circuit: id })),
);
