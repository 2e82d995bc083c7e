import { useSyncExternalStore } from 'react';

export type SchemeChoice = 'system' | 'light' | 'dark';

const storageKey = 'ferrule.light-or-dark';
const listeners = new Set<() => void>();

function darkSystem(): MediaQueryList {
  return window.matchMedia('(prefers-color-scheme: dark)');
}

function readChoice(): SchemeChoice {
  try {
    const kept = localStorage.getItem(storageKey);
    return kept === 'light' || kept === 'dark' ? kept : 'system';
  } catch {
    // A browser may forbid storage; the system's choice then stands.
    return 'system';
  }
}

export function chooseScheme(choice: SchemeChoice): void {
  try {
    if (choice === 'system') localStorage.removeItem(storageKey);
    else localStorage.setItem(storageKey, choice);
  } catch {
    // Not kept, and so nothing to tell the listeners.
    return;
  }
  listeners.forEach((listener) => listener());
}

function watch(changed: () => void) {
  const system = darkSystem();
  listeners.add(changed);
  system.addEventListener('change', changed);
  window.addEventListener('storage', changed);
  return () => {
    listeners.delete(changed);
    system.removeEventListener('change', changed);
    window.removeEventListener('storage', changed);
  };
}

export function useSchemeChoice(): SchemeChoice {
  return useSyncExternalStore(watch, readChoice);
}

/** Light or dark as it should be drawn now. */
export function useAppearance(): 'light' | 'dark' {
  return useSyncExternalStore(watch, () => {
    const choice = readChoice();
    if (choice !== 'system') return choice;
    return darkSystem().matches ? 'dark' : 'light';
  });
}
