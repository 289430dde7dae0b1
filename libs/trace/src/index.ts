export type * from './events';
export type * from './feed';
export { TRACE_FORMAT } from './record';
export type * from './record';
export type * from './state';
