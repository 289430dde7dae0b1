import { answerCall } from './planner-calls';
import type { PlannerRequest, PlannerResponse } from './planner-messages';

function respond({ id, name, args }: PlannerRequest): PlannerResponse {
  try {
    return { id, value: answerCall(name, args) };
  } catch (error) {
    // Told to whoever asked: an error thrown here would reach no screen.
    return { id, error: error instanceof Error ? error.message : String(error) };
  }
}

self.onmessage = ({ data }: MessageEvent<PlannerRequest>) => self.postMessage(respond(data));
