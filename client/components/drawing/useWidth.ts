import { useLayoutEffect, useRef, useState, type RefObject } from 'react';

/** px that an element has to draw in, at least and at most as given; the most until it is laid out. */
export function useWidth(least: number, most: number): readonly [RefObject<HTMLDivElement | null>, number] {
  const box = useRef<HTMLDivElement>(null);
  const [width, setWidth] = useState(most);
  useLayoutEffect(() => {
    const element = box.current;
    if (element === null || typeof ResizeObserver === 'undefined') return undefined;
    const observer = new ResizeObserver(() =>
      setWidth(Math.max(least, Math.min(most, Math.floor(element.clientWidth)))),
    );
    observer.observe(element);
    return () => observer.disconnect();
  }, [least, most]);
  return [box, width];
}
