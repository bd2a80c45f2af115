import { useRef, useState } from 'react';
import type { Design } from '#shared/api/designs.ts';
import type { Problem } from '#shared/api/problem.ts';
import { useShareDesign } from '../../api/designs.ts';
import { isProblem, sentenceOf } from '../../api/problem-error.ts';
import type { ShareDetails } from './share-details.ts';

interface PublishOptions {
  /** Where the share is sent. */
  readonly path: string;
  readonly onPublished: (design: Design) => void;
  readonly onFieldErrors: (errors: NonNullable<Problem['errors']>) => void;
}

const isAbort = (error: unknown): boolean => error instanceof DOMException && error.name === 'AbortError';

/** Sends the share, with its progress and a way to stop it. */
export const usePublish = ({ path, onPublished, onFieldErrors }: PublishOptions) => {
  const { mutateAsync } = useShareDesign();
  const [share, setShare] = useState<number | null>(null);
  const [refusal, setRefusal] = useState<Problem | null>(null);
  const sending = useRef<AbortController | null>(null);

  const publish = async (file: File, details: ShareDetails, idempotencyKey: string): Promise<void> => {
    const controller = new AbortController();
    sending.current = controller;
    setRefusal(null);
    setShare(0);
    try {
      const { signal } = controller;
      onPublished(await mutateAsync({ path, file, details, idempotencyKey, onProgress: setShare, signal }));
    } catch (error) {
      if (isAbort(error)) return;
      if (isProblem(error) && error.problem.errors !== undefined) onFieldErrors(error.problem.errors);
      else if (isProblem(error)) setRefusal(error.problem);
      else {
        const detail = `${sentenceOf(error)} Your draft is kept, and trying again makes no second one.`;
        setRefusal({ type: 'not-published', title: 'Not published', status: 0, detail, requestId: '' });
      }
    } finally {
      setShare(null);
    }
  };
  return { share, refusal, publish, cancel: () => sending.current?.abort() };
};
