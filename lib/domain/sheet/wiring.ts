import * as z from "zod/mini";
import { fields, fieldShapes, type ValuesOf } from "./field";

export const wiringStyles = ["diodes", "bulbs", "light-bar", "trailer-plug"] as const;
export type WiringStyle = (typeof wiringStyles)[number];

/**
 * What a conductor does at one of its ends. A colour never says this. `left` and `right` are the turn signal alone,
 * `left-stop` and `right-stop` carry turn and stop together.
 */
export const wireFunctions = [
  "tail",
  "left",
  "right",
  "left-stop",
  "right-stop",
  "stop",
  "ground",
  "charge",
  "brake-unit",
  "reverse",
  "other",
  "unused",
] as const;
export type WireFunction = (typeof wireFunctions)[number];

export const spliceKinds = [
  "soldered",
  "crimped-sealed",
  "crimped-open",
  "tap",
  "terminal-block",
  "plug",
] as const;

export const wiringFields = fields({
  style: { kind: "choice", of: wiringStyles },
  converter: { kind: "choice", of: ["none", "three-to-two", "two-to-three"] },
  converterAt: { kind: "text", most: 80 },
  stopFeedRelay: { kind: "yes-no" },
});

export const contactFields = fields({
  contact: { kind: "text", most: 40 },
  does: { kind: "choice", of: wireFunctions },
});

export const segmentFields = fields({
  from: { kind: "text", most: 60 },
  to: { kind: "text", most: 60 },
  gaugeAwg: { kind: "count", most: 24 },
  length: { kind: "length" },
});

export const conductorFields = fields({
  color: { kind: "text", most: 30 },
  near: { kind: "choice", of: wireFunctions },
  far: { kind: "choice", of: wireFunctions },
  tagged: { kind: "yes-no" },
});

export const spliceFields = fields({
  at: { kind: "text", most: 60 },
  kind: { kind: "choice", of: spliceKinds },
});

export const groundFields = fields({
  at: { kind: "text", most: 60 },
  devices: { kind: "text", most: 200 },
});

const some = <S extends z.ZodMiniType>(shape: S, most: number) =>
  z.optional(z.array(shape).check(z.maxLength(most, `more than ${most}`)));

const segmentShape = z.strictObject({
  ...fieldShapes(segmentFields),
  conductors: some(z.strictObject(fieldShapes(conductorFields)), 16),
  splices: some(z.strictObject(fieldShapes(spliceFields)), 16),
});

/** The wiring between the vehicles: what was measured at the coach's socket, segment by segment, and what it is grounded to. */
export const wiringShape = z.strictObject({
  ...fieldShapes(wiringFields),
  socket: some(z.strictObject(fieldShapes(contactFields)), 13),
  segments: some(segmentShape, 24),
  grounds: some(z.strictObject(fieldShapes(groundFields)), 12),
});

export type Conductor = ValuesOf<typeof conductorFields>;
export type Segment = ValuesOf<typeof segmentFields> & {
  conductors?: Conductor[];
  splices?: ValuesOf<typeof spliceFields>[];
};
export type Wiring = ValuesOf<typeof wiringFields> & {
  socket?: ValuesOf<typeof contactFields>[];
  segments?: Segment[];
  grounds?: ValuesOf<typeof groundFields>[];
};

/** The conductors that do one thing at one end and another at the other: they want a tag at both. */
export function changing(segment: Segment): Conductor[] {
  return (segment.conductors ?? []).filter(({ near, far }) => near && far && near !== far);
}

/**
 * What is known already of a segment's wires at their near ends: the first begins at the socket, where each contact was
 * measured, every other where the one before it ends. Their far ends are still to be measured.
 */
export function wiresAt({ socket = [], segments = [] }: Wiring, at: number): Conductor[] {
  if (at === 0) return socket.flatMap(({ does }) => (does && does !== "unused" ? [{ near: does }] : []));
  return (segments[at - 1]?.conductors ?? []).flatMap(({ color, far }) => {
    const wire = { ...(color && { color }), ...(far && { near: far }) };
    return Object.keys(wire).length > 0 ? [wire] : [];
  });
}
