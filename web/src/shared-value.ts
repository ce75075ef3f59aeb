import { useSyncExternalStore } from "react";

/** One value that lives outside the tree of components and renews those that read it. */
export interface SharedValue<Value> {
  get: () => Value;
  set: (value: Value) => void;
  /** Calls back after each change; returns how to stop that. */
  subscribe: (listener: () => void) => () => void;
}

export function sharedValue<Value>(initial: Value): SharedValue<Value> {
  let value = initial;
  const listeners = new Set<() => void>();
  return {
    get: () => value,
    set(next) {
      value = next;
      for (const listener of listeners) listener();
    },
    subscribe(listener) {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
  };
}

/** The value now, and a new render when it changes. */
export function useSharedValue<Value>({ subscribe, get }: SharedValue<Value>): Value {
  return useSyncExternalStore(subscribe, get);
}
