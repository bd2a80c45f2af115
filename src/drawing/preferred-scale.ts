const MM_PER_CSS_PX = 25.4 / 96;
/** Preferred numbers of the R10 series (ISO 3), in which drawing scales go up in even steps. */
const series = [1, 1.25, 1.6, 2, 2.5, 3.15, 4, 5, 6.3, 8];

const steps: readonly { readonly ratio: number; readonly text: string }[] = [
  ...[10, 8, 6.3, 5, 4, 3.15, 2.5, 2, 1.6, 1.25].map((times) => ({ ratio: times, text: `${times} : 1` })),
  ...[1, 10, 100].flatMap((decade) =>
    series.map((value) => {
      const by = Number((value * decade).toPrecision(3));
      return { ratio: 1 / by, text: `1 : ${by}` };
    }),
  ),
];

export interface DrawnScale {
  readonly pxPerMm: number;
  /** As in the title block: `1 : 1.6`. */
  readonly text: string;
}

/** The largest preferred scale that is at most so many CSS pixels a millimetre. */
export const preferredScale = (mostPxPerMm: number): DrawnScale => {
  const step = steps.find(({ ratio }) => ratio / MM_PER_CSS_PX <= mostPxPerMm);
  return step === undefined
    ? { pxPerMm: mostPxPerMm, text: 'not to scale' }
    : { pxPerMm: step.ratio / MM_PER_CSS_PX, text: step.text };
};
