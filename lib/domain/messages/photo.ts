/** What a photograph on this phone is told as. */
const states = {
  kept: "kept on this phone",
  sent: "sent",
  lost: "gone from this phone",
} as const;

/** Every sentence about photographs. */
export const photoWords = {
  take: "Take a photograph",
  choose: "Choose one",
  group: "Photograph",
  working: "Making the photograph smaller",
  saved: "The photograph is kept on this phone. It is sent after the walk.",
  faults: {
    unreadable:
      "This browser cannot read that file as a picture. Take a photograph here, or choose a JPEG, PNG or WebP file.",
    "too-large":
      "That picture does not become small enough to keep. Take another, from farther away or plainer.",
    unsaved:
      "The photograph was not kept: this phone did not save it. The walk goes on without it, and you can try again.",
  },
  taken: "The photograph just taken",
  states,
  strip: "Photographs kept for this check",
  each: (place: number, of: number, state: keyof typeof states) =>
    `Photograph ${place} of ${of}, ${states[state]}`,
  waiting: (count: number) =>
    count === 1
      ? "One photograph waits on this phone and is sent by itself."
      : `${count} photographs wait on this phone and are sent by themselves.`,
} as const;

/** Photographs read back at the desk. */
export const photoReadingWords = {
  title: "Photographs",
  sub: "Taken on the walk, and of no one check.",
  alt: (of: string, place: number, count: number) =>
    count === 1 ? `Photograph: ${of}` : `Photograph ${place} of ${count}: ${of}`,
  ofWalk: "the walk as a whole",
  fetching: "Fetching the photograph",
  missing: "Not received yet. Photographs come from the phone by themselves, after the walk.",
  failed: "This photograph could not be fetched.",
  again: "Try again",
} as const;
