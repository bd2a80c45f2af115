const units = [
  { seconds: 86_400, one: 'day', many: 'days' },
  { seconds: 3600, one: 'hour', many: 'hours' },
  { seconds: 60, one: 'minute', many: 'minutes' },
] as const;

/** How long ago, in the largest whole unit: `3 days`, `5 hours`; `a moment` under a minute. */
export const sayAge = (iso: string, now: Date): string => {
  const ageS = Math.max(0, (now.getTime() - new Date(iso).getTime()) / 1000);
  const unit = units.find(({ seconds }) => ageS >= seconds);
  if (unit === undefined) return 'a moment';
  const count = Math.floor(ageS / unit.seconds);
  return `${count} ${count === 1 ? unit.one : unit.many}`;
};
