export type DurationReading =
  | { readonly ok: true; readonly timeS: number; readonly typed: string }
  | { readonly ok: false; readonly message: string };

const clock = /^(\d{1,3}):([0-5]\d)(?::([0-5]\d))?$/;
const amount = '(\\d+(?:[.,]\\d+)?)';
// Minutes may go without their unit only at the end, so that `45 s` is not read as 4 min 5 s.
const inWords = new RegExp(
  `^(?:${amount} ?h(?:ours?|rs?)?)? ?(?:${amount} ?(?:m(?:in(?:utes?|s)?)?|$))? ?(?:${amount} ?s(?:ec(?:onds?|s)?)?)?$`,
);

const figure = (text: string | undefined): number => Number((text ?? '0').replace(',', '.'));

/**
 * Reads a run time: `52` and `52 min` are minutes; `1:08`, `1 h 08` and `1 h 8 min` hours and minutes;
 * `1:08:30` and `45 s` have seconds. The result is in seconds.
 */
export const parseDuration = (text: string): DurationReading => {
  const typed = text.trim();
  const plain = typed.replace(/\s+/g, ' ').toLowerCase();
  const parts = plain === '' ? null : (clock.exec(plain) ?? inWords.exec(plain));
  if (parts === null) {
    return { ok: false, message: 'Type a run time in minutes, or as 1:08 or 1 h 08 for hours and minutes' };
  }
  return { ok: true, timeS: figure(parts[1]) * 3600 + figure(parts[2]) * 60 + figure(parts[3]), typed };
};

/** A run time rounded for reading: `45 s`, `52 min`, `1 h 08`. */
export const formatDuration = (timeS: number): string => {
  const wholeS = Math.round(timeS);
  if (wholeS < 60) return `${wholeS} s`;
  const minutes = Math.round(timeS / 60);
  if (minutes < 60) return `${minutes} min`;
  return `${Math.floor(minutes / 60)} h ${String(minutes % 60).padStart(2, '0')}`;
};
