import { useEffect, useRef, useState } from 'react';

/** Width of an element in px, kept up to date; `undefined` until it has been measured. */
export function useWidth<Place extends HTMLElement>() {
  const place = useRef<Place>(null);
  const [width, setWidth] = useState<number>();
  useEffect(() => {
    if (!place.current) return;
    const observer = new ResizeObserver(([entry]) => setWidth(Math.round(entry!.contentRect.width)));
    observer.observe(place.current);
    return () => observer.disconnect();
  }, []);
  return [place, width] as const;
}
