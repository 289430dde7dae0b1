import type { PlannerRequest, PlannerResponse } from './planner-messages';

/** As much of a worker as a lane needs. */
export interface PlannerPort {
  postMessage(request: PlannerRequest): void;
  terminate(): void;
  onmessage: ((event: MessageEvent<PlannerResponse>) => void) | null;
  onerror: ((event: ErrorEvent) => void) | null;
}

interface Job {
  request: PlannerRequest;
  resolve(value: unknown): void;
  reject(reason: unknown): void;
}

/**
 * One worker that does one job after the other. What nobody wants any more leaves the line, so the newest question is
 * never behind old ones.
 */
export class WorkerLane {
  private port: PlannerPort | null = null;
  private running: Job | null = null;
  private waiting: Job[] = [];

  /** With `breaksOff`, a job under way that nobody wants ends with its worker; else its answer is thrown away. */
  constructor(
    private readonly start: () => PlannerPort,
    private readonly breaksOff: boolean,
  ) {}

  /** Starts the worker before anything is asked of it. Where it cannot start, the first job says so. */
  warm(): void {
    this.port ??= this.open();
  }

  /** The answer to a request; rejects with the worker's error, or with the signal's reason once that is aborted. */
  ask(request: PlannerRequest, signal?: AbortSignal): Promise<unknown> {
    return new Promise((resolve, reject) => {
      if (signal?.aborted) return reject(signal.reason);
      const job = { request, resolve, reject };
      this.waiting.push(job);
      signal?.addEventListener('abort', () => this.drop(job, signal.reason), { once: true });
      this.next();
    });
  }

  private next(): void {
    while (!this.running) {
      const job = this.waiting.shift();
      if (!job) return;
      this.running = job;
      try {
        this.port ??= this.open();
        this.port.postMessage(job.request);
      } catch (error) {
        this.running = null;
        job.reject(error);
      }
    }
  }

  private open(): PlannerPort {
    const port = this.start();
    port.onmessage = ({ data }) => {
      const job = this.running;
      if (job?.request.id !== data.id) return;
      this.running = null;
      if ('error' in data) job.reject(new Error(data.error));
      else job.resolve(data.value);
      this.next();
    };
    // The worker could not be loaded, or died: the job is told, and the next one starts another.
    port.onerror = ({ message }) => {
      const job = this.running;
      this.close();
      job?.reject(new Error(message || 'The planner did not start.'));
      this.next();
    };
    return port;
  }

  private drop(job: Job, reason: unknown): void {
    job.reject(reason);
    this.waiting = this.waiting.filter((other) => other !== job);
    if (this.running !== job || !this.breaksOff) return;
    this.close();
    this.next();
  }

  private close(): void {
    this.port?.terminate();
    this.port = null;
    this.running = null;
  }
}
