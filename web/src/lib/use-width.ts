import { useLayoutEffect, useRef, useState } from 'react';
import type { RefObject } from 'react';

/** The width of an element, px, as it is laid out; what is given until it is. */
export function useWidth<E extends HTMLElement>(before: number): [ref: RefObject<E | null>, width: number] {
  const ref = useRef<E>(null);
  const [width, setWidth] = useState(before);
  useLayoutEffect(() => {
    const element = ref.current;
    if (element === null) return undefined;
    const watch = new ResizeObserver(([entry]) => {
      if (entry) setWidth(Math.max(200, Math.round(entry.contentRect.width)));
    });
    watch.observe(element);
    return () => {
      watch.disconnect();
    };
  }, []);
  return [ref, width];
}
