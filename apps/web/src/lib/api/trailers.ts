import type {
  Page,
  TrailerDto,
  TrailerListQuery,
  UpdateTrailerRequest,
  WriteTrailerRequest,
} from '@lampwright/contracts';
import useSWR from 'swr';
import { api } from '../client';

const trailersKey = (query: TrailerListQuery) => ['trailers', query] as const;
export const useTrailers = (query: TrailerListQuery) =>
  useSWR(trailersKey(query), () => api.get<Page<TrailerDto>>('trailers', query));

const trailerKey = (id: string) => ['trailers', id] as const;
export const useTrailer = (id: string | null) =>
  useSWR(id === null ? null : trailerKey(id), () => api.get<TrailerDto>(`trailers/${id}`));

export const createTrailer = (body: WriteTrailerRequest) => api.post<TrailerDto>('trailers', body);

export const updateTrailer = (id: string, body: UpdateTrailerRequest) =>
  api.patch<TrailerDto>(`trailers/${id}`, body);
