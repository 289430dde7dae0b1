import type { Role } from '@lampwright/contracts';
import useSWR from 'swr';
import { api } from '../client';

export interface HealthDto {
  /** Present where the yard is filled with invented people to try the program with. */
  demo?: { people: { name: string; email: string; role: Role }[]; password: string } | null;
}

export const healthKey = () => ['health'] as const;
export const useHealth = () => useSWR(healthKey(), () => api.get<HealthDto>('health'));
