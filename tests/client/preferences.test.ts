import { describe, expect, test, vi } from "vitest";
import { FIRST_PAINT } from "@/lib/client/first-paint";
import { lookByLight } from "@/lib/client/light";
import {
  attributesOf,
  chosenLook,
  defaultPreferences,
  LIGHT_KEY,
  paper,
  preferenceShapes,
  PREFERENCES_KEY,
  readPreferences,
  type Look,
} from "@/lib/client/preferences";

test.each<[string, string | null, object]>([
  ["nothing", null, {}],
  ["no JSON", "{", {}],
  ["no object", "7", {}],
  ["null", "null", {}],
  ["an older one", '{"look":"night"}', { look: "night" }],
  ["an unknown value beside a known one", '{"look":"dusk","hand":"left"}', { hand: "left" }],
  ["a later one", '{"text":"150","scent":"on"}', { text: "150" }],
  ["a number for words", '{"text":150}', {}],
])("what was kept is read: %s", (_, kept, over) => {
  expect(readPreferences(kept)).toEqual({ ...defaultPreferences, ...over });
});

/** Runs the inline script on a page that keeps these two. */
function firstPaint(preferences: string | null, light: string | null, refused = false) {
  const attributes: Record<string, string> = {};
  const meta = { name: "", content: "", setAttribute: vi.fn() };
  const added: unknown[] = [];
  const document = {
    documentElement: { setAttribute: (name: string, value: string) => void (attributes[name] = value) },
    createElement: () => meta,
    head: { prepend: (element: unknown) => added.push(element) },
  };
  const kept: Record<string, string | null> = { [PREFERENCES_KEY]: preferences, [LIGHT_KEY]: light };
  const localStorage = {
    getItem(key: string) {
      if (refused) throw new DOMException("", "SecurityError");
      return kept[key] ?? null;
    },
  };
  new Function("document", "localStorage", FIRST_PAINT)(document, localStorage);
  return { attributes, color: added.length > 0 ? meta.content : null };
}

describe("the script before the first paint does what the page does after it", () => {
  const cases = preferenceShapes.look.options.flatMap((look) =>
    preferenceShapes.hand.options.flatMap((hand) =>
      preferenceShapes.text.options.flatMap((text) =>
        ([null, "day", "night"] as const).map((light) => ({ look, hand, text, light })),
      ),
    ),
  );
  test.each(cases)("$look $hand $text, light says $light", ({ light, ...over }) => {
    const preferences = { ...defaultPreferences, ...over };
    const wanted = Object.entries(attributesOf(preferences, light)).filter(([, value]) => value !== null);
    const look = chosenLook(preferences, light);
    expect(firstPaint(JSON.stringify(preferences), light)).toEqual({
      attributes: Object.fromEntries(wanted),
      color: look && paper[look],
    });
  });

  test.each([
    ["nothing kept", null],
    ["no JSON", "{"],
    ["values that are not ours", '{"look":"x\\"y","hand":"x","text":"900"}'],
  ])("%s leaves the page as it is", (_, kept) => {
    expect(firstPaint(kept, null)).toEqual({ attributes: {}, color: null });
  });

  test("storage that is refused leaves the page as it is", () => {
    expect(firstPaint(null, null, true)).toEqual({ attributes: {}, color: null });
  });
});

test.each<[number, Look | null, Look]>([
  [0, "day", "night"],
  [49, "day", "night"],
  [50, "day", "day"],
  [50, "night", "night"],
  [99, "night", "night"],
  [100, "night", "day"],
  [75, null, "day"],
  [0, null, "night"],
])("%d lux after %s is %s", (lux, now, look) => {
  expect(lookByLight(lux, now)).toBe(look);
});
