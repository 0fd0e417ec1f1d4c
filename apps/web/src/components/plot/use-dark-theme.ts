import { useSyncExternalStore } from 'react';

const query = '(prefers-color-scheme: dark)';

const subscribe = (onChange: () => void): (() => void) => {
  const list = matchMedia(query);
  list.addEventListener('change', onChange);
  return () => list.removeEventListener('change', onChange);
};

/** Canvases do not follow style sheets: they are drawn anew when the theme changes. */
export const useDarkTheme = (): boolean => useSyncExternalStore(subscribe, () => matchMedia(query).matches);
