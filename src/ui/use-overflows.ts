import { useLayoutEffect, useState, type RefObject } from 'react';

/** Whether an element holds more than it shows, so that it scrolls; looked at anew after each drawing and resize. */
export const useOverflows = (element: RefObject<HTMLElement | null>): boolean => {
  const [overflows, setOverflows] = useState(false);
  useLayoutEffect(() => {
    const look = (): void => {
      const { current } = element;
      // A fraction of a pixel is rounding, not content.
      if (current) setOverflows(current.scrollHeight - current.clientHeight > 1);
    };
    look();
    window.addEventListener('resize', look);
    return () => window.removeEventListener('resize', look);
  });
  return overflows;
};
