import { infiniteQueryOptions, queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type { Design, DesignChange, DesignList } from '#shared/api/designs.ts';
import type { Geometry } from '#shared/api/drawings.ts';
import { queryKeys } from './query-keys.ts';
import { request } from './request.ts';
import { upload } from './upload.ts';

const KEPT_MS = 30 * 60_000;

const pathOf = (slug: string): string => `/api/designs/${encodeURIComponent(slug)}`;

/** The loft, page by page. `search` is the query of `GET /api/designs` without its cursor. */
export const designListQuery = (search: string) =>
  infiniteQueryOptions({
    queryKey: [...queryKeys.designs, 'list', search],
    queryFn: ({ pageParam, signal }) => {
      const params = new URLSearchParams(search);
      if (pageParam !== null) params.set('cursor', pageParam);
      return request<DesignList>('GET', `/api/designs?${params}`, { signal });
    },
    initialPageParam: null as string | null,
    getNextPageParam: ({ nextCursor }) => nextCursor,
    // Kept while a member looks at a design, so that going back finds every page that was opened.
    gcTime: KEPT_MS,
  });

export const designQuery = (slug: string) =>
  queryOptions({
    queryKey: [...queryKeys.designs, 'one', slug],
    queryFn: ({ signal }) => request<Design>('GET', pathOf(slug), { signal }),
  });

/** The outlines of a revision; a revision never changes. */
export const geometryQuery = (slug: string, revision: number) =>
  queryOptions({
    queryKey: [...queryKeys.geometry, slug, revision],
    queryFn: ({ signal }) =>
      request<Geometry>('GET', `${pathOf(slug)}/revisions/${revision}/geometry`, { signal }),
    staleTime: Number.POSITIVE_INFINITY,
  });

interface TakenFor {
  readonly machineId: string | null;
  readonly recordId: string | null;
}

/** Where a drawing or package is taken from: a plain link, so that the browser saves the file itself. */
export const takeHref = (
  slug: string,
  revision: number,
  what: 'package.zip' | 'drawing.svg',
  { machineId, recordId }: TakenFor,
): string => {
  const params = new URLSearchParams();
  if (machineId !== null) params.set('machineId', machineId);
  if (recordId !== null) params.set('recordId', recordId);
  const query = params.size === 0 ? '' : `?${params}`;
  return `${pathOf(slug)}/revisions/${revision}/${what}${query}`;
};

export const useChangeDesign = (slug: string) => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (change: DesignChange) => request<Design>('PATCH', pathOf(slug), { body: change }),
    onSuccess: async (design) => {
      client.setQueryData(designQuery(slug).queryKey, design);
      await client.invalidateQueries({ queryKey: [...queryKeys.designs, 'list'] });
    },
  });
};

/** Takes a design out of the loft; nothing is erased. */
export const useWithdrawDesign = (slug: string) => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => request<undefined>('DELETE', pathOf(slug)),
    onSuccess: () => client.invalidateQueries({ queryKey: queryKeys.designs }),
  });
};

interface Share {
  /** `/api/designs`, or the revisions or remixes of a design. */
  readonly path: string;
  readonly file: File;
  /** The `details` of a design, a revision or a remix. */
  readonly details: object;
  /** One a draft, so that a second try makes no second design. */
  readonly idempotencyKey: string;
  readonly onProgress?: (share: number) => void;
  readonly signal?: AbortSignal;
}

export const useShareDesign = () => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ path, file, details, ...rest }: Share) =>
      upload<Design>(path, {
        file,
        fileName: file.name,
        parts: { details: JSON.stringify(details) },
        ...rest,
      }),
    onSuccess: async (design) => {
      client.setQueryData(designQuery(design.slug).queryKey, design);
      // The original of a remix names it from now on.
      await client.invalidateQueries({ queryKey: queryKeys.designs });
    },
  });
};
