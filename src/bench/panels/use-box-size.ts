import { useEffect, useState, type RefObject } from 'react';
import type { View } from '../camera/camera.ts';

/** Inner size of an element in CSS px, kept up to date; 0 x 0 until it is known. */
export function useBoxSize(element: RefObject<HTMLElement | null>): View {
  const [size, setSize] = useState<View>({ width: 0, height: 0 });
  useEffect(() => {
    const box = element.current;
    if (!box) return undefined;
    const observer = new ResizeObserver(() =>
      setSize({ width: box.clientWidth, height: box.clientHeight }),
    );
    observer.observe(box);
    return () => observer.disconnect();
  }, [element]);
  return size;
}
