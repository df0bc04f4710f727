import { createContext, use, useMemo, useState } from 'react';
import type { ReactNode } from 'react';
import type { Units } from '#shared/accounts/contract.ts';
import { formatQuantity } from './format.ts';
import type { Quantity } from './format.ts';

interface UnitsState {
  units: Units;
  setUnits: (units: Units) => void;
  /** A figure in the chosen units. */
  show: (quantity: Quantity, value: number | null | undefined) => string;
}

const key = 'tubeplate.units';
const Context = createContext<UnitsState | undefined>(undefined);

function remembered(): Units {
  try {
    return localStorage.getItem(key) === 'metric' ? 'metric' : 'imperial';
  } catch {
    return 'imperial';
  }
}

/** Chosen once; every screen follows. Kept on this device. */
export function UnitsProvider({ children }: { children: ReactNode }) {
  const [units, setUnits] = useState<Units>(remembered);
  const state = useMemo<UnitsState>(
    () => ({
      units,
      setUnits: (next) => {
        setUnits(next);
        try {
          localStorage.setItem(key, next);
        } catch {
          // Not remembered; the choice holds for this visit.
        }
      },
      show: (quantity, value) => formatQuantity(quantity, units, value),
    }),
    [units],
  );
  return <Context value={state}>{children}</Context>;
}

export function useUnits(): UnitsState {
  const state = use(Context);
  if (!state) throw new Error('useUnits needs a UnitsProvider above it');
  return state;
}
