import { useEffect, useState, type RefObject } from 'react';

/** The width of an element in CSS pixels, followed as it changes; 0 until it is known. */
export const useWidth = (element: RefObject<HTMLElement | null>): number => {
  const [width, setWidth] = useState(0);
  useEffect(() => {
    const { current } = element;
    if (!current) return;
    const observer = new ResizeObserver(([entry]) => setWidth(Math.floor(entry?.contentRect.width ?? 0)));
    observer.observe(current);
    return () => observer.disconnect();
  }, [element]);
  return width;
};
