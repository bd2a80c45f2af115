import { useState } from 'react';
import type { BitCreate } from '#shared/api/bench.ts';
import { useAddBit } from '../../api/bits.ts';

/** Puts several bits into the drawer, one call each; what was added stays added when a later one fails. */
export const useFillDrawer = () => {
  const { mutateAsync } = useAddBit();
  const [isFilling, setIsFilling] = useState(false);
  const [failure, setFailure] = useState<unknown>(null);
  const fill = async (bits: readonly BitCreate[], onAdded: (bit: BitCreate) => void): Promise<boolean> => {
    setIsFilling(true);
    setFailure(null);
    try {
      for (const bit of bits) {
        await mutateAsync(bit);
        onAdded(bit);
      }
      return true;
    } catch (error) {
      setFailure(error);
      return false;
    } finally {
      setIsFilling(false);
    }
  };
  return { fill, isFilling, failure };
};
