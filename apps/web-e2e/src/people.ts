import { demoYard } from '@lampwright/demo';

type DemoPerson = (typeof demoYard.people)[number];

const first = (role: DemoPerson['role']) => {
  const person = demoYard.people.find((one) => one.role === role);
  if (!person) throw new Error(`The demo yard has no ${role}.`);
  return person;
};

/** One person of the demo yard for each role. */
export const people = {
  technician: first('technician'),
  trainee: first('trainee'),
  lead: first('lead'),
};

/** Where the signed-in browser state of a person is kept for the tests that follow; below the workspace. */
export const stateOf = ({ id }: DemoPerson) => `dist/e2e/${id}.json`;
