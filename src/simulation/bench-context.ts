import { createContext, useContext } from 'react';
import { useStore } from 'zustand';
import type { StoreApi } from 'zustand/vanilla';
import type { BenchStore } from './bench-store.ts';

/** The bench on this page; two benches may live on one page. */
export const BenchContext = createContext<StoreApi<BenchStore> | null>(null);

export function useBench<T>(choose: (store: BenchStore) => T): T {
  const store = useContext(BenchContext);
  if (!store) throw new Error('useBench outside of a bench');
  return useStore(store, choose);
}

export function useBenchApi(): StoreApi<BenchStore> {
  const store = useContext(BenchContext);
  if (!store) throw new Error('useBenchApi outside of a bench');
  return store;
}
