const dayS = 86_400;

/** From the largest: each unit is used from `fromS` on, so that few of a unit are told in the next smaller one. */
const units = [
  { fromS: 730 * dayS, seconds: 365 * dayS, one: 'year', many: 'years' },
  { fromS: 60 * dayS, seconds: 30.4 * dayS, one: 'month', many: 'months' },
  { fromS: dayS, seconds: dayS, one: 'day', many: 'days' },
  { fromS: 3600, seconds: 3600, one: 'hour', many: 'hours' },
  { fromS: 60, seconds: 60, one: 'minute', many: 'minutes' },
] as const;

/** How long ago, in whole units: `3 days`, `16 months`; `a moment` under a minute. */
export const sayAge = (iso: string, now: Date): string => {
  const ageS = Math.max(0, (now.getTime() - new Date(iso).getTime()) / 1000);
  const unit = units.find(({ fromS }) => ageS >= fromS);
  if (unit === undefined) return 'a moment';
  const count = Math.floor(ageS / unit.seconds);
  return `${count} ${count === 1 ? unit.one : unit.many}`;
};
