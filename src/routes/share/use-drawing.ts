import { useCallback, useEffect, useRef, useState } from 'react';
import type { Inspection } from '#shared/api/drawings.ts';
import type { Problem } from '#shared/api/problem.ts';
import { inspectDrawing } from '../../api/drawings.ts';
import { isProblem, sentenceOf } from '../../api/problem-error.ts';
import { keepFile, readKeptFile } from '../../kept/kept-file.ts';

export type DrawingState =
  | { readonly phase: 'none' }
  | { readonly phase: 'sending'; readonly name: string; readonly share: number }
  | { readonly phase: 'refused'; readonly name: string; readonly problem: Problem }
  | {
      readonly phase: 'read';
      readonly file: File;
      /** As the file says, before any scale was stated: its readings are the choices. */
      readonly asFiled: Inspection;
      /** At the stated scale. */
      readonly shown: Inspection;
      /** The scale that `shown` was read at; undefined for the file's own. */
      readonly shownScale: number | undefined;
      readonly isRescaling: boolean;
    };

/** The same limit as the server's, said before anything is sent. */
const MOST_BYTES = 10 * 1024 * 1024;

const unread = (title: string, detail: string): Problem => ({
  type: 'drawing.unread',
  title,
  status: 0,
  detail,
  requestId: '',
});

const problemOf = (error: unknown): Problem =>
  isProblem(error) ? error.problem : unread('The drawing was not read', sentenceOf(error));

const tooLarge = (file: File): Problem | null =>
  file.size <= MOST_BYTES
    ? null
    : unread(
        'The file is too large',
        `${file.name} has ${(file.size / 1024 / 1024).toFixed(1)} MB; at most 10 MB are read. Save it with fewer points, or split it into several drawings.`,
      );

/** The drawing of a draft: sent to be read, read again at a stated scale, and kept over a reload. */
export const useDrawing = (keptAs: string, statedScale: number | undefined) => {
  const [state, setState] = useState<DrawingState>({ phase: 'none' });
  const sending = useRef<AbortController | null>(null);

  const inspect = useCallback(async (file: File, millimetresPerUnit: number | undefined): Promise<void> => {
    sending.current?.abort();
    const problem = tooLarge(file);
    if (problem !== null) {
      setState({ phase: 'refused', name: file.name, problem });
      return;
    }
    const controller = new AbortController();
    sending.current = controller;
    const { signal } = controller;
    setState({ phase: 'sending', name: file.name, share: 0 });
    try {
      const asFiled = await inspectDrawing({
        file,
        signal,
        onProgress: (share) => {
          if (!signal.aborted) setState({ phase: 'sending', name: file.name, share });
        },
      });
      const isSized = asFiled.units.confirmed || millimetresPerUnit === undefined;
      const shown = isSized ? asFiled : await inspectDrawing({ file, millimetresPerUnit, signal });
      const shownScale = isSized ? undefined : millimetresPerUnit;
      if (!signal.aborted) setState({ phase: 'read', file, asFiled, shown, shownScale, isRescaling: false });
    } catch (error) {
      if (!signal.aborted) setState({ phase: 'refused', name: file.name, problem: problemOf(error) });
    }
  }, []);

  /** A file just chosen: whatever scale was stated before was about another one. */
  const read = useCallback(
    (file: File) => {
      void keepFile(keptAs, file);
      void inspect(file, undefined);
    },
    [inspect, keptAs],
  );

  const cancel = useCallback(() => {
    sending.current?.abort();
    void keepFile(keptAs, null);
    setState({ phase: 'none' });
  }, [keptAs]);

  const rescale = useCallback(
    async (millimetresPerUnit: number): Promise<void> => {
      if (state.phase !== 'read') return;
      const { file, asFiled } = state;
      sending.current?.abort();
      const controller = new AbortController();
      sending.current = controller;
      setState({ ...state, isRescaling: true });
      try {
        const again = await inspectDrawing({ file, millimetresPerUnit, signal: controller.signal });
        if (controller.signal.aborted) return;
        setState({
          phase: 'read',
          file,
          asFiled,
          shown: again,
          shownScale: millimetresPerUnit,
          isRescaling: false,
        });
      } catch (error) {
        if (controller.signal.aborted) return;
        setState(
          isProblem(error)
            ? { phase: 'refused', name: file.name, problem: error.problem }
            : { ...state, isRescaling: false },
        );
      }
    },
    [state],
  );

  // Once, when the page opens: the file of the draft.
  const scaleAtStart = useRef(statedScale);
  useEffect(() => {
    let isCurrent = true;
    void readKeptFile(keptAs).then((file) => {
      if (file !== null && isCurrent) void inspect(file, scaleAtStart.current);
    });
    return () => {
      isCurrent = false;
      sending.current?.abort();
    };
  }, [inspect, keptAs]);

  return { state, read, cancel, rescale };
};
