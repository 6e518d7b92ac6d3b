import type { Lamp, LampState, Signal } from "../entry";

const signal: Record<Signal, string> = {
  tail: "Tail lamps",
  left: "Left turn",
  right: "Right turn",
  stop: "Stop",
  hazard: "Hazards",
  "stop-left": "Stop with left turn",
  "stop-right": "Stop with right turn",
};

const lower = (text: string) => text.charAt(0).toLowerCase() + text.slice(1);

const lamp: Record<Lamp, string> = { left: "Left lamp", right: "Right lamp" };
const state: Record<LampState, string> = {
  steady: "Steady",
  flashing: "Flashing",
  dim: "Dim",
  dark: "Dark",
  wrong: "Something else",
};

/** What is said at the lamp board. */
export const lampBoardWords = {
  signal,
  lamp,
  state,
  driver: {
    tail: "Driver: parking lamps on, foot off the pedal.",
    left: "Driver: left signal on.",
    right: "Driver: right signal on.",
    stop: "Driver: press and hold the brake pedal.",
    hazard: "Driver: pedal released, hazard flashers on.",
    "stop-left": "Driver: hold the brake pedal, left signal on.",
    "stop-right": "Driver: hold the brake pedal, right signal on.",
  } satisfies Record<Signal, string>,
  next: (next: Signal | null) => (next ? `Next: ${lower(signal[next])}` : "The last signal."),
  place: (at: number, total: number) => `signal ${at} of ${total}`,
  odd: "Odd",
  again: "Whole check…",
  how: "With two, or alone…",
  howTitle: "How are the signals given?",
  ways: {
    clock: "A second phone prompts the driver",
    arms: "By arm signals",
    clip: "Alone, from a filmed clip",
    plain: "By calling out",
  },
  clockHow:
    "On the driver’s phone, at the foot of Rigs: “Lamp prompter”. Both phones start at the same half minute.",
  answered: "Answered. The next signal comes by itself.",
  separate: "Two lamps a side: turn above, stop and tail below.",
  oddTitle: "Which lamp is not as drawn?",
  oddWhat: (which: Lamp) => `${lamp[which]}: what does it do?`,
  oddSave: "Save as odd",
  oddNone: "Touch the lamp that is odd.",
  oddBack: "Back",
  oddState: (kind: LampState, asDrawn: boolean) => (asDrawn ? "as drawn" : `marked: ${lower(state[kind])}`),
  wholeTitle: "The whole check at once",
  wholeBack: "Back to the signals",
  announce: (at: Signal, left: LampState, right: LampState) =>
    `${signal[at]}. As it should be: left lamp ${lower(state[left])}, right lamp ${lower(state[right])}.`,
  seen: (at: Signal, left: LampState | undefined, right: LampState | undefined) =>
    `${signal[at]}: left ${left ? lower(state[left]) : "not seen"}, right ${right ? lower(state[right]) : "not seen"}`,
} as const;

/** What is asked to show that the brake unit is idle. */
export const brakeIdleWords = {
  lit: {
    title: "Press the car’s brake pedal by hand. Do its stop lamps light?",
    how: "Look now, in this same state: key, battery and fuse as for towing. A lamp that cannot light here proves nothing.",
    yes: "They light",
    no: "They stay dark",
    unknown: "Couldn’t see",
  },
  dark: {
    title: "Let go of the pedal. Are the stop lamps dark?",
    how: "With the unit set and idle. Lit now means that the pedal is held down a little.",
    yes: "Dark",
    no: "Still lit",
  },
  pedal: {
    title: "Is the pedal all the way up, on its stop?",
    how: "Lift it by hand: it has no way left to go.",
    yes: "All the way up",
    no: "Not all the way",
  },
  idle: {
    title: "Do unit and monitor show idle?",
    how: "On the unit and on the monitor in the coach, as the maker’s manual shows it.",
    yes: "Both idle",
    no: "Not both",
  },
  whole: "Whole check…",
  notes: {
    lamps: "Idle shown by the stop lamps: lit with the pedal pressed, dark with it up.",
    looks:
      "Not shown by lamps: they were not seen to light with the pedal pressed. Pedal fully up, unit and monitor idle. Feel the wheels at the first stop.",
    lit: "Stop lamps lit with the pedal up.",
    pedal: "Pedal not all the way up.",
    idle: "Unit and monitor not both idle.",
  },
} as const;
