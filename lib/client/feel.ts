import { preferences } from "./preference-store";

/** What happened, for ear and hand; the screen always says it as well. */
export const feelings = ["saved", "fault", "hold", "tick", "trouble"] as const;
export type Feeling = (typeof feelings)[number];

/** A tone: when it starts, how long it lasts and how high it is. */
type Tone = { atMs: number; ms: number; hz: number };
type Pattern = { tones: readonly Tone[]; vibration: readonly number[] };

/**
 * Told apart by rhythm alone (a vibration has no pitch, and not everyone hears pitch) and by pitch as well: one short
 * is saved, two falling a fault, three long and low a hold, four quick ones trouble. A tick is the beat of a countdown.
 */
export const patterns: Record<Feeling, Pattern> = {
  saved: { tones: [{ atMs: 0, ms: 70, hz: 880 }], vibration: [40] },
  fault: {
    tones: [
      { atMs: 0, ms: 110, hz: 660 },
      { atMs: 180, ms: 110, hz: 440 },
    ],
    vibration: [90, 90, 90],
  },
  hold: {
    tones: [
      { atMs: 0, ms: 260, hz: 330 },
      { atMs: 380, ms: 260, hz: 330 },
      { atMs: 760, ms: 260, hz: 247 },
    ],
    vibration: [260, 120, 260, 120, 260],
  },
  tick: { tones: [{ atMs: 0, ms: 30, hz: 1320 }], vibration: [15] },
  trouble: {
    tones: [0, 120, 240, 360].map((atMs) => ({ atMs, ms: 60, hz: 523 })),
    vibration: [60, 60, 60, 60, 60, 60, 60],
  },
};

type Ears = typeof globalThis & { webkitAudioContext?: typeof AudioContext };

/** Whether this browser can sound a tone. */
export function canSound(): boolean {
  return "AudioContext" in globalThis || "webkitAudioContext" in globalThis;
}

/** Whether this browser can make the phone vibrate; a desk computer says so too and does nothing. */
export function canVibrate(): boolean {
  return typeof navigator !== "undefined" && typeof navigator.vibrate === "function";
}

/**
 * Lets what happened be heard and felt, as far as the person wants it and the phone can. Call it from a tap: browsers
 * sound nothing before one. It never throws and nothing waits for it.
 */
export function feel(feeling: Feeling): void {
  const { sound, vibration } = preferences();
  const { tones, vibration: pulses } = patterns[feeling];
  try {
    if (vibration === "on" && canVibrate()) navigator.vibrate([...pulses]);
  } catch {
    // A browser that forbids it.
  }
  if (sound === "on" && canSound()) void play(tones).catch(() => {});
}

let ears: AudioContext | null = null;
// Loud enough beside an idling engine; a phone's own volume has the last word.
const LOUDNESS = 0.4;
// A tone that starts or ends at full strength clicks.
const EDGE_S = 0.008;

async function play(tones: readonly Tone[]): Promise<void> {
  const Context = globalThis.AudioContext ?? (globalThis as Ears).webkitAudioContext;
  ears ??= new Context();
  // A phone that slept, or a call, suspends it.
  if (ears.state !== "running") await ears.resume();
  const begin = ears.currentTime + 0.01;
  for (const { atMs, ms, hz } of tones) {
    const [from, until] = [begin + atMs / 1000, begin + (atMs + ms) / 1000];
    const tone = new OscillatorNode(ears, { type: "triangle", frequency: hz });
    const gain = new GainNode(ears, { gain: 0 });
    gain.gain.setValueAtTime(0, from);
    gain.gain.linearRampToValueAtTime(LOUDNESS, from + EDGE_S);
    gain.gain.setValueAtTime(LOUDNESS, until - EDGE_S);
    gain.gain.linearRampToValueAtTime(0, until);
    tone.connect(gain).connect(ears.destination);
    tone.start(from);
    tone.stop(until);
  }
}
