/** How the published JSON Schema of a rig sheet introduces itself and the parts that have no field of their own. */
export const sheetSchemaWords = {
  title: "Rig sheet",
  description:
    "How one coach, one car and the gear between them are built, as read off the vehicles and their plates. A member " +
    "that is absent: nobody has looked yet. Null: looked for, and not known. A quantity is held in SI beside the value " +
    "and unit that were entered. Numbers have at most six decimals. The list that Hookfast makes of a sheet is its own " +
    "and no part of it.",
  id: "The thing's own id, a lower-case UUID. By it the thing keeps its history when it goes to another rig.",
  parts: {
    name: { label: "Name", where: "What its keeper calls the rig." },
    notes: { label: "Notes", where: "Whatever has no field of its own." },
    coach: { label: "Coach", where: "The motorhome that tows." },
    car: { label: "Car", where: "The car that is towed on its four wheels." },
    gear: { label: "Gear", where: "The pieces between the two, in walking order." },
    wiring: { label: "Wiring", where: "What carries the signals from the coach's socket to the car's tail." },
    procedure: {
      label: "The car's own procedure",
      where: "What the owner's manual of this very car says about towing it on four wheels.",
    },
  },
  lists: {
    socket: { label: "Coach's socket", where: "Its contacts, each as measured." },
    segments: { label: "Segments", where: "The runs of wire, from the coach to the lamps." },
    grounds: { label: "Ground points", where: "Where devices are grounded." },
    conductors: {
      label: "Conductors",
      where: "The wires of a segment, each with what it does at either end.",
    },
    splices: { label: "Splices", where: "Where wires are joined within a segment." },
  },
} as const;
