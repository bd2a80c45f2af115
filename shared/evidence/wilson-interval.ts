export interface Interval {
  readonly low: number;
  readonly high: number;
}

/** The 97.5 % point of the normal distribution: two-sided 95 %. */
const Z = 1.959963984540054;

/**
 * The 95 % score interval of a share of `votesFor` out of `votes` (Wilson 1927; compared by Newcombe
 * 1998). Between 0 and 1; without any votes nothing is known: 0 to 1.
 */
export const wilsonInterval = (votesFor: number, votes: number): Interval => {
  if (votes === 0) return { low: 0, high: 1 };
  const share = votesFor / votes;
  const zz = Z * Z;
  const centre = share + zz / (2 * votes);
  const reach = Z * Math.sqrt((share * (1 - share)) / votes + zz / (4 * votes * votes));
  const scale = 1 + zz / votes;
  return {
    // At none and at all the ends are exactly 0 and 1; rounding must not blur them.
    low: votesFor === 0 ? 0 : (centre - reach) / scale,
    high: votesFor === votes ? 1 : (centre + reach) / scale,
  };
};
