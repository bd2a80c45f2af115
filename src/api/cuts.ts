import { infiniteQueryOptions, queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type {
  CutCorrection,
  CutCreate,
  CutRecord,
  CutRecordWithHistory,
  InServiceCreate,
} from '#shared/api/cuts.ts';
import type { List } from './list.ts';
import { queryKeys } from './query-keys.ts';
import { create, request } from './request.ts';
import { upload } from './upload.ts';

const pathOf = (id: string): string => `/api/cuts/${encodeURIComponent(id)}`;

/** One record with what it said before it was corrected. */
export const cutQuery = (id: string) =>
  queryOptions({
    queryKey: [...queryKeys.cuts, 'one', id],
    queryFn: ({ signal }) => request<CutRecordWithHistory>('GET', pathOf(id), { signal }),
  });

/** My newest records: the next cut is often in the same stock, held the same way. */
export const lastCutsQuery = queryOptions({
  queryKey: [...queryKeys.cuts, 'newest of mine'],
  queryFn: ({ signal }) => request<List<CutRecord>>('GET', '/api/cuts?whose=mine', { signal }),
});

/** The cut log, page by page. `search` is the query of `GET /api/cuts` without its cursor. */
export const cutLogQuery = (search: string) =>
  infiniteQueryOptions({
    queryKey: [...queryKeys.cuts, 'log', search],
    queryFn: ({ pageParam, signal }) => {
      const params = new URLSearchParams(search);
      if (pageParam !== null) params.set('cursor', pageParam);
      return request<List<CutRecord>>('GET', `/api/cuts?${params}`, { signal });
    },
    initialPageParam: null as string | null,
    getNextPageParam: ({ nextCursor }) => nextCursor,
  });

export const cutLogCsvHref = (search: string): string => `/api/cuts.csv${search === '' ? '' : `?${search}`}`;
export const photoHref = (id: string): string => `/api/photos/${encodeURIComponent(id)}`;

/** A record changes its design's tally, the standing in the loft, and the log. */
export const useRefreshEvidence = () => {
  const client = useQueryClient();
  return async (): Promise<void> => {
    void client.invalidateQueries({ queryKey: queryKeys.cuts });
    await client.invalidateQueries({ queryKey: queryKeys.designs });
  };
};

interface NewRecord {
  readonly slug: string;
  readonly given: CutCreate;
  /** One a draft, so that a second try makes no second record. */
  readonly idempotencyKey: string;
}

export const useRecordCut = () => {
  const refresh = useRefreshEvidence();
  return useMutation({
    mutationFn: ({ slug, given, idempotencyKey }: NewRecord) =>
      request<CutRecord>('POST', `/api/designs/${encodeURIComponent(slug)}/cuts`, {
        body: given,
        idempotencyKey,
      }),
    onSuccess: refresh,
  });
};

export const useCorrectCut = () => {
  const refresh = useRefreshEvidence();
  return useMutation({
    mutationFn: ({ id, given }: { id: string; given: CutCorrection }) =>
      request<CutRecord>('PATCH', pathOf(id), { body: given }),
    onSuccess: refresh,
  });
};

export const useNoteInService = (id: string) => {
  const refresh = useRefreshEvidence();
  return useMutation({
    mutationFn: (given: InServiceCreate) => create<CutRecord>(`${pathOf(id)}/in-service`, given),
    onSuccess: refresh,
  });
};

export type Photo = CutRecord['photos'][number];

interface NewPhoto {
  readonly cutId: string;
  readonly file: File;
  readonly idempotencyKey: string;
  readonly onProgress: (share: number) => void;
}

export const addPhoto = ({ cutId, file, ...rest }: NewPhoto): Promise<Photo> =>
  upload<Photo>(`${pathOf(cutId)}/photos`, { file, fileName: file.name, ...rest });
