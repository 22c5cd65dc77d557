import { useSyncExternalStore } from 'react';
import { keepOnDevice, readFromDevice } from './device-store.ts';

export interface Preference<Value extends string> {
  read: () => Value;
  choose: (value: Value) => void;
  use: () => Value;
  subscribe: (listener: () => void) => () => void;
}

/** A choice of this person on this device, which every place on the page follows at once. */
export function devicePreference<Value extends string>(
  key: string,
  values: readonly Value[],
  fallback: Value,
): Preference<Value> {
  const listeners = new Set<() => void>();
  const kept = readFromDevice(key);
  let current = values.find((value) => value === kept) ?? fallback;
  const read = () => current;
  const subscribe = (listener: () => void) => {
    listeners.add(listener);
    return () => {
      listeners.delete(listener);
    };
  };
  return {
    read,
    subscribe,
    choose: (value) => {
      current = value;
      keepOnDevice(key, value);
      listeners.forEach((listener) => listener());
    },
    use: () => useSyncExternalStore(subscribe, read),
  };
}

/** Lengths in the workshop's unit, or in this person's own. */
export const unitPreference = devicePreference('unit', ['workshop', 'mm', 'inch'], 'workshop');

/** Notes by letter, or in the syllables of fixed do. */
export const notesPreference = devicePreference('notes', ['letters', 'syllables'], 'letters');

/** How far this person's fingers reach from hole to hole. */
export const handPreference = devicePreference('hand', ['small', 'middle', 'large'], 'middle');

/** Single keys such as `/` and `?`; speech control and some keyboards want them off. */
export const singleKeysPreference = devicePreference('single-keys', ['on', 'off'], 'on');

export const motionPreference = devicePreference('motion', ['device', 'less'], 'device');

export const themePreference = devicePreference('theme', ['day', 'evening', 'device'], 'device');
