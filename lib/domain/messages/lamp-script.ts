import { signals } from "../entry";
import type { Signal } from "../lamp-script";

type SignalWords = {
  /** As few letters as will do, to be read from where the driver sits: a line each. */
  huge: readonly [string] | readonly [string, string];
  name: string;
  /** What the driver does, and keeps doing while it is held. */
  press: string;
  /** Within a sentence, as what is seen at the car’s tail. */
  seen: string;
  /** In a list. */
  short: string;
  /** How the watcher asks for it. */
  arms: string;
};

const signalWords: Record<Signal, SignalWords> = {
  tail: {
    huge: ["Tail"],
    name: "Tail lamps",
    press: "Parking lights on, no signal, foot off the brake.",
    seen: "the tail lamps come on",
    short: "tail",
    arms: "The arm on the car’s left points down at the lamp.",
  },
  left: {
    huge: ["Left"],
    name: "Left turn",
    press: "Left signal on, foot off the brake.",
    seen: "the left signal starts to flash",
    short: "left",
    arms: "The arm on the car’s left is straight out.",
  },
  right: {
    huge: ["Right"],
    name: "Right turn",
    press: "Right signal on, foot off the brake.",
    seen: "the right signal starts to flash",
    short: "right",
    arms: "The arm on the car’s right is straight out.",
  },
  stop: {
    huge: ["Stop"],
    name: "Stop",
    press: "Hold the brake pedal, no signal.",
    seen: "the stop lamps come on",
    short: "stop",
    arms: "Both fists are up.",
  },
  hazard: {
    huge: ["Hazards"],
    name: "Hazards",
    press: "Hazard switch on, foot off the brake.",
    seen: "the hazards start to flash",
    short: "hazards",
    arms: "Both arms are straight out and wave up and down.",
  },
  "stop-left": {
    huge: ["Stop", "left"],
    name: "Stop with left turn",
    press: "Hold the brake pedal, left signal on.",
    seen: "the stop lamps are on and the left one starts to flash",
    short: "stop with left",
    arms: "The arm on the car’s left is straight out, the other fist is up.",
  },
  "stop-right": {
    huge: ["Stop", "right"],
    name: "Stop with right turn",
    press: "Hold the brake pedal, right signal on.",
    seen: "the stop lamps are on and the right one starts to flash",
    short: "stop with right",
    arms: "The arm on the car’s right is straight out, the other fist is up.",
  },
};

const lower = (text: string) => text.charAt(0).toLowerCase() + text.slice(1);

/** The words of the lamp test’s scripts: two phones in step, arms, and one person’s clip. */
export const lampScriptWords = {
  signal: signalWords,

  bar: {
    title: "A script for two",
    hold: "Each signal is held for",
    seconds: (seconds: number) => `${seconds} s`,
    spokenSeconds: (seconds: number) => `${seconds} seconds`,
    start: "Start together",
    stop: "Stop the script",
    clock: "Time now",
    startsAt: (time: string) => `Both phones start at ${time}.`,
    startsIn: (seconds: number) => `In ${seconds} s`,
    compare: "The other phone names the same time, and its clock shows the same second.",
    left: (seconds: number) => `${seconds} s left`,
    driver: (press: string) => `Driver: ${lower(press)}`,
    next: (name: string) => `Next: ${lower(name)}`,
    last: "This is the last one.",
    place: (place: number, total: number) => `signal ${place} of ${total}`,
  },

  prompt: {
    title: "Lamp prompter",
    lead: "For the driver’s phone. It says what to press and records nothing; the phone behind the car records.",
    agree: "First hold the two phones side by side: same time, same seconds to hold. Then tap on both.",
    secured: "The coach is held by its parking brake. Nobody between the vehicles while either can move.",
    first: (name: string) => `First: ${lower(name)}`,
    done: "All seven. Again?",
    doneHint: "Only the other phone knows what was seen.",
    back: "Back to the rigs",
  },

  arms: {
    summary: "The arms for each signal",
    agreed:
      "Agree on these first. They are how some owners do it, and common practice, not a rule: any arms will do as " +
      "long as both of you mean the same.",
    title: (name: string) => `Arms for ${lower(name)}`,
    description: (arms: string, lit: string) =>
      "The watcher stands behind the car and faces forward, as the driver sees it in the mirror or the rear camera: " +
      `the car’s left is on the left. ${arms} ${lit}`,
    lit: {
      left: "The left lamp is lit.",
      right: "The right lamp is lit.",
      both: "Both lamps are lit.",
    },
    left: "LEFT",
    right: "RIGHT",
  },

  clip: {
    title: "Alone: film it first",
    lead:
      "Stand the phone where it sees both lamps, start filming, and give the seven signals from the driver’s seat, a " +
      "few seconds each. Then mark here when each one begins.",
    kept: "The clip stays on this phone. It is not sent, and it is gone when this page closes.",
    film: "Film a clip",
    choose: "Choose a clip",
    unreadable: "This phone cannot play that clip. Choose another, or film it with this phone.",
    ask: (seen: string) => `Tap Here when ${seen}`,
    place: (place: number, total: number) => `${place} of ${total}`,
    video: "The filmed clip",
    at: (time: string) => `At ${time}`,
    here: "Here",
    missing: "Not in the clip",
    undo: "Back one signal",
    rewind: "Back 5 s",
    play: "Play",
    pause: "Pause",
    slow: "Half speed",
    nothing: "No signal was marked in this clip.",
    again: "Mark it again",
    other: "Another clip",
    back: "Back without a clip",
    picture: (name: string) => `The clip where it shows ${lower(name)}, over and over`,
    notFilmed: (name: string) => `The clip does not show ${lower(name)}.`,
  },
};

/** A place in a clip: 0:04. */
export function clipTime(seconds: number): string {
  const whole = Math.floor(seconds);
  return `${Math.floor(whole / 60)}:${String(whole % 60).padStart(2, "0")}`;
}

/** What a mark says about the clip it was read from; null where no signal was marked in it. */
export function clipNote(moments: Partial<Record<Signal, number>>): string | null {
  const parts = signals.flatMap((signal) => {
    const seconds = moments[signal];
    return seconds === undefined ? [] : [`${signalWords[signal].short} ${clipTime(seconds)}`];
  });
  return parts.length > 0 ? `From a filmed clip: ${parts.join(", ")}` : null;
}
