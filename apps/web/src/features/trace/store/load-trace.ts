import type { TraceDto } from '@lampwright/contracts';
import { NetworkError } from '../../../lib/api-error';
import type { Keeper } from './outbox';
import type { TraceApi } from './trace-api';

/** What the screens need of a trace. */
export type OpenableTrace = Pick<TraceDto, 'record' | 'writable'>;

interface LoadDeps {
  api: TraceApi;
  keeper: Keeper;
}

/** The trace as the server has it; without an answer, as this device last saw it. */
export async function loadTrace(id: string, { api, keeper }: LoadDeps): Promise<OpenableTrace> {
  const key = `trace:1:${id}`;
  try {
    const { record, writable } = await api.read(id);
    await keeper.write(key, { record, writable } satisfies OpenableTrace);
    return { record, writable };
  } catch (error) {
    if (!(error instanceof NetworkError)) throw error;
    const kept = (await keeper.read(key)) as OpenableTrace | undefined;
    if (!kept) throw error;
    return kept;
  }
}
