import { useSyncExternalStore } from 'react';

/** Whether a media query is true now. `whenUnknown` is the answer where there is no browser: in prerendered pages. */
export function useMedia(query: string, whenUnknown = false): boolean {
  return useSyncExternalStore(
    (changed) => {
      const media = matchMedia(query);
      media.addEventListener('change', changed);
      return () => media.removeEventListener('change', changed);
    },
    () => matchMedia(query).matches,
    () => whenUnknown,
  );
}

/** Still until we know better: a page never starts moving for a reader who asked for rest. */
export const useReducedMotion = (): boolean => useMedia('(prefers-reduced-motion: reduce)', true);
