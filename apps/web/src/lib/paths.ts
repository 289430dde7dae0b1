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
  importPlan: () => '/plans/import',
  plan: (id: string) => `/plans/${encodeURIComponent(id)}`,
  people: () => '/people',
  person: (id: string) => `/people/${encodeURIComponent(id)}`,
  account: () => '/account',
} as const;
