import { beforeEach, expect, test, vi } from "vitest";
import { feelings, patterns, type Feeling } from "@/lib/client/feel";

beforeEach(() => {
  vi.unstubAllGlobals();
  vi.resetModules();
});

/** What a phone with ears and a motor heard and felt. */
async function phone(preferences: object, broken = false) {
  const heard: number[] = [];
  const felt: number[][] = [];
  let contexts = 0;
  class Node_ {
    gain = { setValueAtTime() {}, linearRampToValueAtTime() {} };
    constructor(_: unknown, { frequency }: { frequency?: number }) {
      if (frequency) heard.push(frequency);
    }
    connect = () => this;
    start() {}
    stop() {}
  }
  vi.stubGlobal("localStorage", { getItem: () => JSON.stringify(preferences) });
  vi.stubGlobal("OscillatorNode", Node_);
  vi.stubGlobal("GainNode", Node_);
  vi.stubGlobal(
    "AudioContext",
    class {
      state = "running";
      currentTime = 0;
      constructor() {
        contexts += 1;
        if (broken) throw new Error("no ears");
      }
    },
  );
  vi.stubGlobal("navigator", {
    vibrate: (pulses: number[]) => {
      if (broken) throw new Error("no motor");
      felt.push(pulses);
    },
  });
  const { feel } = await import("@/lib/client/feel");
  return { feel, heard, felt, contexts: () => contexts };
}

test.each<[object, boolean, boolean]>([
  [{}, true, true],
  [{ sound: "off" }, false, true],
  [{ vibration: "off" }, true, false],
  [{ sound: "off", vibration: "off" }, false, false],
])("with %j: sound %s, vibration %s", async (preferences, sounds, vibrates) => {
  const { feel, heard, felt } = await phone(preferences);
  feel("fault");
  expect([heard, felt]).toEqual([sounds ? [660, 440] : [], vibrates ? [[90, 90, 90]] : []]);
});

test("the ears are made at the first sound and once", async () => {
  const { feel, contexts } = await phone({});
  expect(contexts()).toBe(0);
  feel("saved");
  feel("tick");
  expect(contexts()).toBe(1);
});

test("a phone that fails at it, or has nothing of it, is no trouble", async () => {
  const { feel } = await phone({}, true);
  feel("hold");
  await new Promise((done) => setTimeout(done));
  vi.unstubAllGlobals();
  vi.resetModules();
  const bare = await import("@/lib/client/feel");
  bare.feel("hold");
  expect([bare.canSound(), bare.canVibrate()]).toEqual([false, false]);
});

test("each is told apart by rhythm alone, for ears and hand", () => {
  const rhythm = (kind: Feeling) => patterns[kind].tones.map(({ atMs, ms }) => `${atMs}+${ms}`).join();
  const pulses = (kind: Feeling) => patterns[kind].vibration.join();
  expect(new Set(feelings.map(rhythm)).size).toBe(feelings.length);
  expect(new Set(feelings.map(pulses)).size).toBe(feelings.length);
});
