import { followLight, lookByLight } from "./light";
import {
  attributesOf,
  chosenLook,
  LIGHT_KEY,
  paper,
  PREFERENCES_KEY,
  readPreferences,
  type Look,
  type Preferences,
} from "./preferences";

const listeners = new Set<() => void>();
let current: Preferences | null = null;
let light: Look | null = null;

/** The choices now. Kept in this browser, or for this page alone where the browser keeps nothing. */
export function preferences(): Preferences {
  return (current ??= readPreferences(kept(PREFERENCES_KEY)));
}

export function subscribePreferences(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

/** Makes a choice; it shows at once, here and in every other tab. */
export function choose<K extends keyof Preferences>(key: K, value: Preferences[K]): void {
  // Read again: another tab may have chosen something else meanwhile, and its message may still be on the way.
  const stored = kept(PREFERENCES_KEY);
  current = { ...(stored === null ? preferences() : readPreferences(stored)), [key]: value };
  keep(PREFERENCES_KEY, JSON.stringify(current));
  apply();
}

/** Follows the choices of other tabs, and the light where it decides; what it returns ends that. */
export function followPreferences(): () => void {
  const stored = (event: StorageEvent) => {
    if (event.key !== PREFERENCES_KEY && event.key !== null) return;
    current = null;
    apply();
  };
  window.addEventListener("storage", stored);
  let unlight: (() => void) | null = null;
  const followLook = () => {
    const wanted = preferences().look === "light";
    if (wanted && !unlight) unlight = followLight(measured);
    if (wanted || !unlight) return;
    unlight();
    unlight = null;
  };
  const unsubscribe = subscribePreferences(followLook);
  apply();
  return () => {
    window.removeEventListener("storage", stored);
    unsubscribe();
    unlight?.();
  };
}

function measured(lux: number): void {
  const next = lookByLight(lux, light);
  if (next === light) return;
  light = next;
  keep(LIGHT_KEY, next);
  apply();
}

function apply(): void {
  const stored = kept(LIGHT_KEY);
  light ??= stored === "day" || stored === "night" ? stored : null;
  for (const [name, value] of Object.entries(attributesOf(preferences(), light))) {
    if (value === null) document.documentElement.removeAttribute(name);
    else document.documentElement.setAttribute(name, value);
  }
  colorBars(chosenLook(preferences(), light));
  for (const listener of listeners) listener();
}

/** The browser's own bars follow a chosen look by a meta element in front of those that follow the phone. */
function colorBars(look: Look | null): void {
  const ours = document.head.querySelector<HTMLMetaElement>("meta[data-chosen]");
  if (!look) return ours?.remove();
  const meta = ours ?? document.createElement("meta");
  meta.name = "theme-color";
  meta.content = paper[look];
  meta.dataset.chosen = "";
  if (!ours) document.head.prepend(meta);
}

function kept(key: string): string | null {
  try {
    return localStorage.getItem(key);
  } catch {
    return null;
  }
}

function keep(key: string, value: string): void {
  try {
    localStorage.setItem(key, value);
  } catch {
    // Storage that is full or refused: the choice holds for this page.
  }
}
