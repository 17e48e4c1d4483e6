import { useCallback, useState, type RefCallback } from 'react';

/** The width in px of the element that takes the ref, kept up to date; `fallback` until it is known. */
export const useElementWidth = (fallback: number): readonly [RefCallback<HTMLElement>, number] => {
  const [width, setWidth] = useState(fallback);
  const measure: RefCallback<HTMLElement> = useCallback((element) => {
    if (!element || typeof ResizeObserver === 'undefined') return undefined;
    const take = (px: number): void => {
      if (px > 0) setWidth(Math.round(px));
    };
    take(element.getBoundingClientRect().width);
    const observer = new ResizeObserver(([entry]) => take(entry?.contentRect.width ?? 0));
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return [measure, width];
};
