export { HarnessDrawing } from './harness-drawing';
export { HarnessList } from './harness-list';
export { SuspicionBar } from './suspicion-bar';
export type { DrawingMarks, DrawingTrailer, HarnessDrawingProps, PlaceMark } from './marks';
