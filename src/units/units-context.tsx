import { createContext, type ReactNode, useCallback, useContext, useMemo, useState } from 'react';
import type { UnitSystem } from '#shared/units/system.ts';
import { keep, readKept } from '../kept/kept.ts';

interface Units {
  readonly system: UnitSystem;
  readonly setSystem: (system: UnitSystem) => void;
}

const UnitsContext = createContext<Units>({ system: 'mm', setSystem: () => undefined });

export function UnitsProvider({ children }: { readonly children: ReactNode }) {
  const [system, setState] = useState<UnitSystem>(() => (readKept('units') === 'in' ? 'in' : 'mm'));
  const setSystem = useCallback((next: UnitSystem) => {
    keep('units', next);
    setState(next);
  }, []);
  const units = useMemo(() => ({ system, setSystem }), [system, setSystem]);
  return <UnitsContext value={units}>{children}</UnitsContext>;
}

/** The units the member reads and types, switched in one place: the strip. */
export const useUnits = (): Units => useContext(UnitsContext);
