import { useSyncExternalStore } from 'react';

export const colourModes = ['light', 'dark', 'system'] as const;
export type ColourMode = (typeof colourModes)[number];

/** Known to public/first-paint.js too, which runs before the first paint. */
const key = 'linkfell.colour-mode';
const listeners = new Set<() => void>();
const darkQuery = '(prefers-color-scheme: dark)';

/** What the reader chose; "system" when nothing is stored or storage is closed to us. */
export function storedMode(): ColourMode {
  try {
    const value = localStorage.getItem(key);
    return value === 'light' || value === 'dark' ? value : 'system';
  } catch {
    return 'system';
  }
}

function apply(): void {
  const mode = storedMode();
  const dark = mode === 'dark' || (mode === 'system' && matchMedia(darkQuery).matches);
  const root = document.documentElement;
  root.classList.toggle('dark', dark);
  root.classList.toggle('light', !dark);
  root.dataset.theme = dark ? 'dark' : 'light';
}

/** Keeps the choice for the next visit and repaints at once. */
export function chooseMode(mode: ColourMode): void {
  try {
    if (mode === 'system') localStorage.removeItem(key);
    else localStorage.setItem(key, mode);
  } catch {
    // Without storage the choice lasts as long as the page.
  }
  apply();
  listeners.forEach((listener) => listener());
}

function subscribe(listener: () => void): () => void {
  const media = matchMedia(darkQuery);
  const changed = () => {
    apply();
    listener();
  };
  listeners.add(listener);
  media.addEventListener('change', changed);
  window.addEventListener('storage', changed);
  return () => {
    listeners.delete(listener);
    media.removeEventListener('change', changed);
    window.removeEventListener('storage', changed);
  };
}

export function useColourMode(): ColourMode {
  return useSyncExternalStore(subscribe, storedMode, () => 'system');
}
