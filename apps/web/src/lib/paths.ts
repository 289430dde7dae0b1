/** Every address of the web, built in one place. */
export const paths = {
  yard: () => '/',
  signIn: () => '/sign-in',
  traces: () => '/traces',
  newTrace: (trailerId?: string) =>
    trailerId ? `/traces/new?trailer=${encodeURIComponent(trailerId)}` : '/traces/new',
  trace: (id: string) => `/traces/${encodeURIComponent(id)}`,
  trailers: () => '/trailers',
  newTrailer: () => '/trailers/new',
  trailer: (id: string) => `/trailers/${encodeURIComponent(id)}`,
  editTrailer: (id: string) => `/trailers/${encodeURIComponent(id)}/edit`,
  plans: () => '/plans',
  /** With an id the file becomes that plan's next revision. */
  importPlan: (planId?: string) =>
    planId ? `/plans/import?plan=${encodeURIComponent(planId)}` : '/plans/import',
  plan: (id: string) => `/plans/${encodeURIComponent(id)}`,
  people: () => '/people',
  account: () => '/account',
} as const;
