import { beforeEach, expect, test, vi } from "vitest";

type Handler = (event: { key: string | null }) => void;

/** A page with its own attributes, and a storage that several pages can share. */
function page(kept: Map<string, string>, refused = false) {
  const attributes = new Map<string, string>();
  const metas: { name?: string; content?: string; dataset: object; remove: () => void }[] = [];
  const stored: Handler[] = [];
  const make = () => {
    const meta = { dataset: {}, remove: () => void metas.splice(metas.indexOf(meta), 1) };
    return meta;
  };
  vi.stubGlobal("localStorage", {
    getItem(key: string) {
      if (refused) throw new DOMException("", "SecurityError");
      return kept.get(key) ?? null;
    },
    setItem(key: string, value: string) {
      if (refused) throw new DOMException("", "QuotaExceededError");
      kept.set(key, value);
    },
  });
  vi.stubGlobal("document", {
    documentElement: {
      setAttribute: (name: string, value: string) => attributes.set(name, value),
      removeAttribute: (name: string) => attributes.delete(name),
    },
    createElement: make,
    head: {
      querySelector: () => metas[0] ?? null,
      prepend: (meta: (typeof metas)[0]) => metas.unshift(meta),
    },
  });
  vi.stubGlobal("window", {
    addEventListener: (_: string, handler: Handler) => stored.push(handler),
    removeEventListener: (_: string, handler: Handler) => stored.splice(stored.indexOf(handler), 1),
  });
  return { attributes, metas, stored };
}

beforeEach(() => void vi.resetModules());
const load = () => import("@/lib/client/preference-store");

test("a choice shows at once, is kept, and can be taken back", async () => {
  const kept = new Map<string, string>();
  const { attributes, metas } = page(kept);
  const { choose, preferences, subscribePreferences } = await load();
  const told = vi.fn();
  subscribePreferences(told);

  choose("look", "night");
  choose("hand", "left");
  choose("text", "150");
  expect(Object.fromEntries(attributes)).toEqual({
    "data-look": "night",
    "data-hand": "left",
    "data-text": "150",
  });
  expect(metas).toMatchObject([{ name: "theme-color", content: "#101214" }]);
  choose("look", "day");
  expect(metas).toMatchObject([{ content: "#faf8f2" }]);
  expect(JSON.parse(kept.get("hookfast-preferences")!)).toMatchObject({ look: "day", text: "150" });
  expect(told).toHaveBeenCalledTimes(4);

  choose("look", "device");
  choose("hand", "right");
  choose("text", "100");
  expect([attributes.size, metas.length]).toEqual([0, 0]);
  expect(preferences().look).toBe("device");
});

test("a choice of another tab shows here, and choosing here does not undo it", async () => {
  const kept = new Map<string, string>();
  const { attributes, stored } = page(kept);
  const { choose, followPreferences, preferences } = await load();
  const stop = followPreferences();
  kept.set("hookfast-preferences", JSON.stringify({ hand: "left" }));
  stored[0]!({ key: "hookfast-preferences" });
  expect(attributes.get("data-hand")).toBe("left");

  // Its message about this one is still on the way.
  kept.set("hookfast-preferences", JSON.stringify({ hand: "left", units: "si" }));
  choose("text", "125");
  expect(preferences()).toMatchObject({ hand: "left", units: "si", text: "125" });

  kept.clear();
  stored[0]!({ key: null });
  expect(attributes.size).toBe(0);
  stop();
  expect(stored).toEqual([]);
});

test("where the browser keeps nothing a choice holds for this page", async () => {
  const { attributes } = page(new Map(), true);
  const { choose, preferences } = await load();
  choose("hand", "left");
  choose("text", "200");
  expect(preferences()).toMatchObject({ hand: "left", text: "200" });
  expect(Object.fromEntries(attributes)).toEqual({ "data-hand": "left", "data-text": "200" });
});

test("by the light: the sensor runs only then, and the page follows it", async () => {
  const kept = new Map<string, string>();
  const { attributes } = page(kept);
  const sensors: { illuminance: number; running: boolean; heard: () => void }[] = [];
  vi.stubGlobal(
    "AmbientLightSensor",
    class {
      illuminance = 0;
      running = false;
      heard = () => {};
      constructor() {
        sensors.push(this);
      }
      addEventListener(type: string, heard: () => void) {
        if (type === "reading") this.heard = heard;
      }
      start() {
        this.running = true;
      }
      stop() {
        this.running = false;
      }
    },
  );
  const { choose, followPreferences } = await load();
  followPreferences();
  expect(sensors).toEqual([]);
  choose("look", "light");
  const [sensor] = sensors;
  expect(sensor!.running).toBe(true);
  const read = (illuminance: number) => {
    sensor!.illuminance = illuminance;
    sensor!.heard();
    return attributes.get("data-look");
  };
  expect([read(0), read(50), read(100), read(50), read(0)]).toEqual([
    "night",
    "night",
    "day",
    "day",
    "night",
  ]);
  expect(kept.get("hookfast-light")).toBe("night");
  choose("look", "device");
  expect([sensor!.running, attributes.has("data-look")]).toEqual([false, false]);
});
