import * as z from "zod/mini";

/** What a person can choose for this browser; every member has a default, so that an older object still reads. */
export const preferenceShapes = {
  /** device: as the phone is set. light: by the light sensor, where there is one. */
  look: z.enum(["device", "day", "night", "light"]),
  hand: z.enum(["right", "left"]),
  sound: z.enum(["on", "off"]),
  vibration: z.enum(["on", "off"]),
  /** The size of text, in percent of the browser's own. */
  text: z.enum(["100", "125", "150", "200"]),
  units: z.enum(["us", "si"]),
};

export type Preferences = { [K in keyof typeof preferenceShapes]: z.infer<(typeof preferenceShapes)[K]> };
export type Look = "day" | "night";

export const defaultPreferences: Preferences = {
  look: "device",
  hand: "right",
  sound: "on",
  vibration: "on",
  text: "100",
  units: "us",
};

/** Where the choices are kept; `app/layout.tsx` reads both before the first paint, see `first-paint.ts`. */
export const PREFERENCES_KEY = "hookfast-preferences";
/** What the light said last, so that the next page opens in that look. */
export const LIGHT_KEY = "hookfast-light";

/** Reads what was kept. A member that is missing or unknown is its default, and the others still count. */
export function readPreferences(kept: string | null): Preferences {
  const raw = parsed(kept);
  const members = Object.entries(preferenceShapes).map(([key, shape]) => {
    const read = shape.safeParse(raw[key]);
    return [key, read.success ? read.data : defaultPreferences[key as keyof Preferences]];
  });
  return Object.fromEntries(members) as Preferences;
}

function parsed(kept: string | null): Record<string, unknown> {
  try {
    const raw: unknown = JSON.parse(kept ?? "{}");
    return typeof raw === "object" && raw !== null ? (raw as Record<string, unknown>) : {};
  } catch {
    return {};
  }
}

/** The look that was chosen, or null where the phone's own setting decides. */
export function chosenLook({ look }: Preferences, light: Look | null): Look | null {
  if (look === "light") return light;
  return look === "device" ? null : look;
}

/** The attributes of <html> that the stylesheet goes by; null for one that is absent. */
export function attributesOf(preferences: Preferences, light: Look | null): Record<string, string | null> {
  const { hand, text } = preferences;
  return {
    "data-look": chosenLook(preferences, light),
    "data-hand": hand === "left" ? "left" : null,
    "data-text": text === "100" ? null : text,
  };
}

/** The paper of each look, for the browser's own bars; the same as `--paper` in `app/globals.css`. */
export const paper: Record<Look, string> = { day: "#faf8f2", night: "#101214" };
