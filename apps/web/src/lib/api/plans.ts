import type {
  Page,
  PageQuery,
  PlanDto,
  PlanSummaryDto,
  WritePlanRequest,
} from '@lampwright/contracts';
import useSWR from 'swr';
import { api } from '../client';

const plansKey = (query: PageQuery) => ['plans', query] as const;
export const usePlans = (query: PageQuery) =>
  useSWR(plansKey(query), () => api.get<Page<PlanSummaryDto>>('plans', query));

const planKey = (id: string) => ['plans', id] as const;
export const usePlan = (id: string | null) =>
  useSWR(id === null ? null : planKey(id), () => api.get<PlanDto>(`plans/${id}`));

export const createPlan = (body: WritePlanRequest) => api.post<PlanDto>('plans', body);

export const revisePlan = (id: string, body: WritePlanRequest) =>
  api.post<PlanDto>(`plans/${id}/revisions`, body);
