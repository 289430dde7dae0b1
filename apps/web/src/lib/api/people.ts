import type {
  CreatePersonRequest,
  Page,
  PageQuery,
  PersonDto,
  SessionDto,
  UpdatePersonRequest,
} from '@lampwright/contracts';
import useSWR from 'swr';
import { api } from '../client';

const peopleKey = (query: PageQuery) => ['people', query] as const;
export const usePeople = (query: PageQuery) =>
  useSWR(peopleKey(query), () => api.get<Page<PersonDto>>('people', query));

export const createPerson = (body: CreatePersonRequest) => api.post<PersonDto>('people', body);

export const updatePerson = (id: string, body: UpdatePersonRequest) =>
  api.patch<PersonDto>(`people/${id}`, body);

export const closePerson = (id: string) => api.post<PersonDto>(`people/${id}/close`);
export const reopenPerson = (id: string) => api.post<PersonDto>(`people/${id}/reopen`);

const personSessionsKey = (id: string) => ['people', id, 'sessions'] as const;
export const usePersonSessions = (id: string) =>
  useSWR(personSessionsKey(id), () => api.get<SessionDto[]>(`people/${id}/sessions`));

export const endPersonSession = (id: string, sessionId: string) =>
  api.delete(`people/${id}/sessions/${sessionId}`);
