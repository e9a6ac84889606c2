'use client';

import { useEffect, useRef, useState, type RefObject } from 'react';

/** The width an element has, in CSS pixels; `firstWidth` until it is measured, and on the server. */
export function useWidth<Element extends HTMLElement>(firstWidth: number): [RefObject<Element | null>, number] {
  const ref = useRef<Element>(null);
  const [width, setWidth] = useState(firstWidth);
  useEffect(() => {
    const element = ref.current;
    if (element === null) return undefined;
    const observer = new ResizeObserver(([entry]) => {
      if (entry !== undefined) setWidth(Math.round(entry.contentRect.width));
    });
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return [ref, width];
}
