import { useLayoutEffect, useRef, useState, type RefObject } from 'react';
import type { Size } from './layout/frame';

/** What a sheet measures before it has been laid out. */
const USUAL: Size = { width: 720, height: 480 };

/** The size of an element in whole pixels, followed as it changes. */
export function useSize<E extends HTMLElement>(): [RefObject<E | null>, Size] {
  const ref = useRef<E>(null);
  const [size, setSize] = useState(USUAL);
  useLayoutEffect(() => {
    const element = ref.current;
    if (!element) return;
    const measure = () => {
      const width = Math.round(element.clientWidth);
      const height = Math.round(element.clientHeight);
      if (!width || !height) return;
      setSize((old) => (old.width === width && old.height === height ? old : { width, height }));
    };
    measure();
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return [ref, size];
}
