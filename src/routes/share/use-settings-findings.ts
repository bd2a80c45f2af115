import { useQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import type { Machine } from '#shared/api/bench.ts';
import { firstCut } from '#shared/api/cuts.ts';
import type { Finding } from '#shared/api/findings.ts';
import { checkSettings } from '#shared/rules/rules.ts';
import { bitsQuery } from '../../api/bits.ts';
import type { ShareValues } from './share-values.ts';

/** What the rules say of the settings in the form, once they are complete enough to be checked. */
export const useSettingsFindings = (
  values: ShareValues,
  machines: readonly Machine[],
): readonly Finding[] => {
  const bits = useQuery(bitsQuery).data?.items;
  const { isCut, cut, bitFrom } = values;
  return useMemo(() => {
    if (isCut !== 'yes') return [];
    // How it came out is asked last and does not matter to the rules.
    const outcome = cut.outcome === '' ? 'clean' : cut.outcome;
    const read = firstCut.safeParse({ ...cut, outcome });
    if (!read.success) return [];
    const { bit, materialId, stockThicknessMm, settings, machineId } = read.data;
    const bitMaxRpm = bits?.find(({ id }) => id === bitFrom)?.maxRpm;
    const machine = machines.find(({ id }) => id === machineId);
    return checkSettings({ bit, bitMaxRpm, materialId, stockThicknessMm, settings, machine });
  }, [isCut, cut, bitFrom, bits, machines]);
};
