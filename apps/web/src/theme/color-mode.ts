import { useSyncExternalStore } from 'react';

/** What the reader chose: one of the two, or to follow the system. */
export type ColorModeChoice = 'light' | 'dark' | 'system';

const KEY = 'color-mode';
const listeners = new Set<() => void>();
const systemDark = () => window.matchMedia('(prefers-color-scheme: dark)');

function storedChoice(): ColorModeChoice {
  const stored = window.localStorage.getItem(KEY);
  return stored === 'light' || stored === 'dark' ? stored : 'system';
}

function apply(): void {
  const choice = storedChoice();
  const dark = choice === 'system' ? systemDark().matches : choice === 'dark';
  document.documentElement.classList.toggle('dark', dark);
  listeners.forEach((tell) => tell());
}

/** Stores the choice (or forgets it, for *system*) and shows it at once. */
export function chooseColorMode(choice: ColorModeChoice): void {
  if (choice === 'system') window.localStorage.removeItem(KEY);
  else window.localStorage.setItem(KEY, choice);
  apply();
}

function subscribe(tell: () => void): () => void {
  listeners.add(tell);
  const query = systemDark();
  query.addEventListener('change', apply);
  return () => {
    listeners.delete(tell);
    query.removeEventListener('change', apply);
  };
}

/** The mode now shown and the reader's choice; follows the system while nothing is chosen. */
export function useColorMode(): { shown: 'light' | 'dark'; choice: ColorModeChoice } {
  const shown = useSyncExternalStore(subscribe, () =>
    document.documentElement.classList.contains('dark') ? 'dark' : 'light',
  );
  const choice = useSyncExternalStore(subscribe, storedChoice);
  return { shown, choice };
}
