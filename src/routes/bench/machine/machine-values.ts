import type { DefaultValues } from 'react-hook-form';
import type { Machine, MachineCreate } from '#shared/api/bench.ts';
import type { MachineClass } from '#shared/api/vocabulary.ts';
import { machineClassDefaults } from '#shared/cutting/machine-classes.ts';

/** What stands in the form of a new machine: the class's defaults, and nothing where only a ruler can tell. */
export const newMachineValues = (machineClass: MachineClass): DefaultValues<MachineCreate> => {
  const { zTravelMm, openingMm, maxFeedMmPerMin, maxPlungeMmPerMin, rapidMmPerMin, spindlePowerW, ...rest } =
    machineClassDefaults[machineClass];
  return {
    name: '',
    class: machineClass,
    marginMm: { left: 0, right: 0, front: 0, back: 0 },
    clampStripMm: 0,
    zTravelMm,
    openingMm,
    maxFeedMmPerMin,
    maxPlungeMmPerMin,
    rapidMmPerMin,
    spindle:
      rest.spindle.kind === 'range'
        ? rest.spindle
        : { kind: 'dial', positionsRpm: [...rest.spindle.positionsRpm] },
    spindlePowerW,
    colletsMm: [...rest.colletsMm],
  };
};

/** The fields that a class stands in for until they are measured. */
export const classFields = [
  'zTravelMm',
  'openingMm',
  'maxFeedMmPerMin',
  'maxPlungeMmPerMin',
  'rapidMmPerMin',
  'spindle',
  'spindlePowerW',
  'colletsMm',
] as const satisfies readonly (keyof MachineCreate)[];

/** A machine without what the server adds to it. */
export const machineValues = ({ id: _id, version: _version, createdAt: _at, ...values }: Machine) => values;
