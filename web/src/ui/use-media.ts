import { useCallback, useSyncExternalStore } from 'react';

/** Whether a media query holds now, kept up to date. */
export function useMedia(query: string): boolean {
  const subscribe = useCallback(
    (listener: () => void) => {
      const media = window.matchMedia(query);
      media.addEventListener('change', listener);
      return () => media.removeEventListener('change', listener);
    },
    [query],
  );
  return useSyncExternalStore(subscribe, () => window.matchMedia(query).matches);
}

/** One column: a screen below 768 px. What such a screen folds away is printed all the same. */
export function useNarrow(): boolean {
  return useMedia('screen and (max-width: 767px)');
}
