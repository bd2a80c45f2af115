import type { Machine, Spindle } from '#shared/api/bench.ts';
import { accelerationOf } from '#shared/cutting/machine-classes.ts';
import { formatFeed } from '#shared/units/feed.ts';
import { trimmed } from '#shared/units/figures.ts';
import { formatLength, formatLengthBare } from '#shared/units/length.ts';
import { formatRpm, formatRpmBare } from '#shared/units/spindle-speed.ts';
import type { UnitSystem } from '#shared/units/system.ts';

const saySpindle = (spindle: Spindle): string =>
  spindle.kind === 'range'
    ? `${formatRpmBare(spindle.minRpm)} to ${formatRpm(spindle.maxRpm)}`
    : `dial: ${spindle.positionsRpm.map(formatRpmBare).join(', ')} rpm`;

/** A collet by the size it is sold as: inch sizes stay inch sizes in either unit system. */
export const sayCollet = (mm: number): string =>
  Number.isInteger(mm) ? formatLength(mm, 'mm', { trim: true }) : formatLength(mm, 'in', { trim: true });

/** What the bench says of a machine: label, and value with its unit. */
export const machineFacts = (
  machine: Machine,
  system: UnitSystem,
): readonly (readonly [string, string])[] => {
  const trim = { digits: 1, trim: true } as const;
  const acceleration = accelerationOf(machine);
  const { left, right, front, back } = machine.marginMm;
  return [
    ['Z travel', formatLength(machine.zTravelMm, system, trim)],
    ['Opening', formatLength(machine.openingMm, system, trim)],
    [
      'Margins, left right front back',
      `${[left, right, front, back].map((mm) => formatLengthBare(mm, system, trim)).join(' · ')} ${system}`,
    ],
    ['Clamp strip', formatLength(machine.clampStripMm, system, trim)],
    ['Feed, at most', formatFeed(machine.maxFeedMmPerMin, system)],
    ['Plunge, at most', formatFeed(machine.maxPlungeMmPerMin, system)],
    ['Rapid', formatFeed(machine.rapidMmPerMin, system)],
    [
      'Acceleration',
      `${trimmed(acceleration.mmPerS2, 0)} mm/s²${acceleration.isClassDefault ? ', class default (P)' : ''}`,
    ],
    ['Power', `${trimmed(machine.spindlePowerW, 0)} W`],
    ['Collets', machine.colletsMm.map(sayCollet).join(', ')],
    ['Spindle', saySpindle(machine.spindle)],
  ];
};
