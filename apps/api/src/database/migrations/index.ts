import { InitialTables } from './initial-tables';

/** Every migration in order. A name is for ever: it is recorded in the database. */
export const MIGRATIONS = [{ name: '20261201-initial-tables', class: InitialTables }];
