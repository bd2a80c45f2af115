import type { ShareMode } from './share-mode.ts';
import type { WordsValues } from './WordsFields.tsx';

/** What stands in the form: everything may still be missing. */
export interface ShareValues extends WordsValues {
  licence: string;
  /** Of a revision or a remix: what changed. */
  changeNote: string;
  /** Which reading of an unsized file was chosen; `measured` when a size was stated. */
  scaleFrom: string;
  measuredMm?: number | undefined;
  scale: { millimetresPerUnit?: number | undefined };
  /** Asked outright, since "not cut yet" is an answer and an empty form is not. */
  isCut: '' | 'yes' | 'no';
  /** The id of an own bit, or `described`. */
  bitFrom: string;
  cut: {
    machineId: string;
    bit: { diameterMm?: number | undefined; flutes?: number | undefined; kind: string };
    materialId: string;
    stockThicknessMm?: number | undefined;
    settings: {
      spindleRpm?: number | undefined;
      feedMmPerMin?: number | undefined;
      plungeMmPerMin?: number | undefined;
      depthOfCutMm?: number | undefined;
      stepoverMm?: number | undefined;
    };
    holdDown: string;
    outcome: string;
    runTimeS?: number | undefined;
    notes: string;
  };
}

export const emptyShare: ShareValues = {
  title: '',
  kind: '',
  summary: '',
  licence: '',
  changeNote: '',
  tags: [],
  scaleFrom: '',
  scale: {},
  isCut: '',
  bitFrom: '',
  cut: {
    machineId: '',
    bit: { kind: '' },
    materialId: '',
    settings: {},
    holdDown: '',
    outcome: '',
    notes: '',
  },
};

/** What the form begins with: a revision keeps its licence, a remix its kind and what its licence leaves. */
export const startOf = (mode: ShareMode): ShareValues => {
  if (mode.kind === 'new') return emptyShare;
  if (mode.kind === 'revision') return { ...emptyShare, licence: mode.licence };
  const [only, ...others] = mode.licences;
  return {
    ...emptyShare,
    title: `${mode.title}, remixed`.slice(0, 90),
    kind: mode.designKind,
    licence: only !== undefined && others.length === 0 ? only : '',
  };
};
