import { useSyncExternalStore } from 'react';
import { type ChartTheme, lightTheme } from './chartTheme.ts';
import { readChartTheme } from './readChartTheme.ts';

let current: ChartTheme | null = null;

function snapshot(): ChartTheme {
  current ??= readChartTheme(document.documentElement);
  return current;
}

/** Tells when the page's theme may have changed: by its switch, by the system, or for print. */
function subscribe(notify: () => void): () => void {
  const changed = () => {
    const next = readChartTheme(document.documentElement);
    if (current !== null && JSON.stringify(next) === JSON.stringify(current)) return;
    current = next;
    notify();
  };
  changed();
  const root = document.documentElement;
  const observer = new MutationObserver(changed);
  observer.observe(root, { attributes: true, attributeFilter: ['class', 'data-theme', 'style'] });
  const queries = ['(prefers-color-scheme: dark)', 'print'].map((query) => matchMedia(query));
  for (const query of queries) query.addEventListener('change', changed);
  return () => {
    observer.disconnect();
    for (const query of queries) query.removeEventListener('change', changed);
  };
}

/** The colours pictures are drawn with, kept up to date. */
export function useChartTheme(): ChartTheme {
  return useSyncExternalStore(subscribe, snapshot, () => lightTheme);
}
