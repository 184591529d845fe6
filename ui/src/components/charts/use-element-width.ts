import { useEffect, useRef, useState, type RefObject } from 'react';

// What is drawn before the element was measured: a phone's width, so that nothing jumps outside the page.
const WIDTH_BEFORE_MEASURING = 328;

/** Follows the width an element gets, so that a chart draws its text at its true size. */
export function useElementWidth(): [RefObject<HTMLDivElement | null>, number] {
  const element = useRef<HTMLDivElement>(null);
  const [width, setWidth] = useState(WIDTH_BEFORE_MEASURING);
  useEffect(() => {
    const measured = element.current;
    if (!measured) return undefined;
    const observer = new ResizeObserver(([entry]) => {
      if (entry) setWidth(Math.floor(entry.contentRect.width));
    });
    observer.observe(measured);
    return () => observer.disconnect();
  }, []);
  return [element, width];
}
