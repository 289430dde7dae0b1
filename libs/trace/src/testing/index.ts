export { lamp, lineHarness, plug, run } from './lineHarness';
export { newRecord } from './newRecord';
export { fuse, seriesLamp, Teller } from './Teller';
export { truthfulTester } from './truthfulTester';
