import { fixed, grouped } from './figures.ts';
import { readNumberText } from './number-text.ts';

export type RpmReading =
  | { readonly ok: true; readonly rpm: number; readonly typed: string }
  | { readonly ok: false; readonly message: string };

/** Reads a spindle speed in rev/min; a comma before three digits parts the thousands. */
export const parseRpm = (text: string): RpmReading => {
  const typed = text.trim();
  if (typed === '') return { ok: false, message: 'Type a spindle speed, such as 18000 rpm' };
  const number = readNumberText(typed, 'A spindle speed', { commaGroupsThousands: true });
  if (!number.ok) return number;
  if (!['', 'rpm', 'rev/min', '/min', '1/min'].includes(number.unitText.replaceAll(' ', ''))) {
    return { ok: false, message: `The unit "${number.unitText}" is not known: use rpm` };
  }
  return { ok: true, rpm: number.value, typed };
};

/** A spindle speed without its unit, thousands parted: `18 000`. */
export const formatRpmBare = (rpm: number): string => grouped(fixed(rpm, 0));

/** A spindle speed with its unit: `18 000 rpm`. */
export const formatRpm = (rpm: number): string => `${formatRpmBare(rpm)} rpm`;
