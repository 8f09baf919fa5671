import { useSyncExternalStore } from 'react';

export type Setting<T extends string> = {
  readonly get: () => T;
  readonly set: (value: T) => void;
  readonly subscribe: (listener: () => void) => () => void;
};

/** A choice of this browser, kept in local storage where that is open; another tab's change is followed. */
export function createSetting<T extends string>(key: string, allowed: readonly T[], fallback: T): Setting<T> {
  const listeners = new Set<() => void>();
  let value = load();

  function load(): T {
    try {
      const stored = localStorage.getItem(key);
      return allowed.find((one) => one === stored) ?? fallback;
    } catch {
      return fallback;
    }
  }
  function tell(): void {
    for (const listener of listeners) listener();
  }
  globalThis.addEventListener('storage', (event) => {
    if (event.key !== key) return;
    value = load();
    tell();
  });

  return {
    get: () => value,
    set(next) {
      value = next;
      try {
        localStorage.setItem(key, next);
      } catch {
        // Storage is closed: the choice lasts as long as the page.
      }
      tell();
    },
    subscribe(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
  };
}

export function useSetting<T extends string>(setting: Setting<T>): T {
  return useSyncExternalStore(setting.subscribe, setting.get, setting.get);
}
