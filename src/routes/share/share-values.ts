import type { DesignDetails } from '#shared/api/designs.ts';
import type { WordsValues } from './WordsFields.tsx';

/** What stands in the form: everything may still be missing. */
export interface ShareValues extends WordsValues {
  licence: string;
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

/** The `details` of the contract, as far as the form has them; the schema says what is wrong with them. */
export const detailsOf = (values: ShareValues): Record<keyof DesignDetails, unknown> => {
  const { title, kind, summary, licence, tags, scale, isCut, cut } = values;
  return {
    title,
    kind,
    summary,
    licence,
    tags,
    scale: scale.millimetresPerUnit === undefined ? undefined : scale,
    cut: isCut === 'yes' ? cut : undefined,
  };
};
