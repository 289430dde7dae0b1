import type { DemoDto } from '@lampwright/contracts';
import useSWR from 'swr';
import { api } from '../client';

const demoKey = () => ['demo'] as const;
export const useDemo = () => useSWR(demoKey(), () => api.get<DemoDto>('demo'));
