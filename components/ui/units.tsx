'use client';

import { createContext, type ReactNode, useContext } from 'react';
import { type UnitSystem } from '@/lib/units/format';

const UnitsContext = createContext<UnitSystem>('metric');

export type UnitsProviderProps = Readonly<{ system: UnitSystem; children: ReactNode }>;

/** The person's units, for every figure below. */
export function UnitsProvider({ system, children }: UnitsProviderProps) {
  return <UnitsContext value={system}>{children}</UnitsContext>;
}

export function useUnits(): UnitSystem {
  return useContext(UnitsContext);
}
