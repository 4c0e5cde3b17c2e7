'use client';

import { useEffect, useState } from 'react';

/** A value that follows another once that has stood still for a while: for what is slow to draw or to hear. */
export function useSettled<T>(value: T, stillMs: number): T {
  const [settled, setSettled] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => setSettled(value), stillMs);
    return () => clearTimeout(timer);
  }, [value, stillMs]);
  return settled;
}
