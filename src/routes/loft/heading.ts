const designs = (count: number): string => (count === 1 ? '1 design' : `${count} designs`);

interface Counts {
  readonly total: number;
  /** How many of them lie on the bed; null without a machine. */
  readonly fitting: number | null;
  readonly machineName: string | null;
  readonly onlyFitting: boolean;
}

/** What is counted and no more: a bed that fits does not yet mean a bit that does. */
export const headingOf = ({ total, fitting, onlyFitting }: Counts): string => {
  if (total === 0) return 'No designs';
  if (fitting === null) return designs(total);
  if (onlyFitting) return `${designs(total)}, ${total === 1 ? 'and it fits' : 'all of them on'} your bed`;
  if (fitting === total)
    return `${designs(total)}, ${total === 1 ? 'and it fits' : 'every one fits'} your bed`;
  return `${designs(total)}, ${fitting} ${fitting === 1 ? 'fits' : 'fit'} your bed`;
};

export const subheadingOf = ({ total, fitting, machineName, onlyFitting }: Counts): string => {
  if (total === 0) return '';
  if (fitting === null || machineName === null)
    return 'Each drawn alone, since your bench has no machine yet.';
  const left = total - fitting;
  const drawn = `Drawn to one scale on the bed of ${machineName}.`;
  return onlyFitting || left === 0 ? drawn : `${drawn} ${left} ${left === 1 ? 'does' : 'do'} not fit it.`;
};
