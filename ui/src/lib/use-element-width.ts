import { useLayoutEffect, useRef, useState, type RefObject } from 'react';

/** The width an element has been given, so that a chart can be laid out in real pixels; `assumed` until it is measured. */
export function useElementWidth<Target extends HTMLElement>(assumed: number): [RefObject<Target | null>, number] {
  const target = useRef<Target>(null);
  const [width, setWidth] = useState(assumed);
  useLayoutEffect(() => {
    const element = target.current;
    if (!element) return undefined;
    const measure = () => {
      const measured = Math.round(element.getBoundingClientRect().width);
      if (measured > 0) setWidth(measured);
    };
    measure();
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return [target, width];
}
