import { useSyncExternalStore } from 'react';

export const themeChoices = ['system', 'light', 'dark'] as const;
export type ThemeChoice = (typeof themeChoices)[number];

// public/theme-before-paint.js reads the same key before the first paint.
const STORAGE_KEY = 'brimgate-theme';
const listeners = new Set<() => void>();
const systemIsDark = () => window.matchMedia('(prefers-color-scheme: dark)');

function storedChoice(): ThemeChoice {
  try {
    return themeChoices.find((choice) => choice === localStorage.getItem(STORAGE_KEY)) ?? 'system';
  } catch {
    return 'system';
  }
}

function apply(choice: ThemeChoice): void {
  const isDark = choice === 'dark' || (choice === 'system' && systemIsDark().matches);
  document.documentElement.classList.toggle('dark', isDark);
  document.documentElement.classList.toggle('light', !isDark);
}

export function chooseTheme(choice: ThemeChoice): void {
  try {
    localStorage.setItem(STORAGE_KEY, choice);
  } catch {
    // Storage is closed to us: the choice lasts as long as the page.
  }
  apply(choice);
  listeners.forEach((listener) => listener());
}

/** Follows the system while nobody has chosen otherwise. */
export function watchSystemTheme(): void {
  systemIsDark().addEventListener('change', () => apply(storedChoice()));
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

export const useThemeChoice = (): ThemeChoice => useSyncExternalStore(subscribe, storedChoice);
