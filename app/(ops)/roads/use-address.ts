'use client';

import { useEffect, useState } from 'react';

/** What of the screen can be shared: the chosen road and the time; null means the worst road, and now. */
export interface RoadsAddress {
  readonly segmentId: number | null;
  readonly at: number | null;
}

/** Browsers refuse a change of address for every pixel dragged. */
const settleMs = 180;

function write({ segmentId, at }: RoadsAddress): void {
  const url = new URL(window.location.href);
  const set = (name: string, value: number | null) => {
    if (value === null) url.searchParams.delete(name);
    else url.searchParams.set(name, String(value));
  };
  set('segment', segmentId);
  set('at', at);
  if (url.href !== window.location.href) window.history.replaceState(window.history.state, '', url);
}

/** The address as state, written to the browser's a moment after it last changed, without a new entry in its history. */
export function useAddress(first: RoadsAddress): [RoadsAddress, (change: Partial<RoadsAddress>) => void] {
  const [address, setAddress] = useState(first);
  useEffect(() => {
    const timer = setTimeout(() => write(address), settleMs);
    return () => clearTimeout(timer);
  }, [address]);
  return [address, (change) => setAddress((before) => ({ ...before, ...change }))];
}
