import { randomUUID } from "node:crypto";
import { quantityOf } from "@/lib/domain/sheet/quantity";
import type { Sheet } from "@/lib/domain/sheet/sheet";

/** A sheet with a bit of everything; its things have ids of their own. */
export function givenSheet(over: Partial<Sheet> = {}): Sheet {
  return {
    v: 1,
    name: "Test rig",
    notes: null,
    coach: {
      id: randomUUID(),
      description: "A long gray coach",
      gvwr: quantityOf("mass", 22000, "lb"),
      gcwr: quantityOf("mass", 26000, "lb"),
      tagAxleRating: null,
    },
    car: {
      id: randomUUID(),
      year: 2019,
      description: "A small blue car",
      curb: quantityOf("mass", 1400, "kg"),
    },
    gear: {
      dropReceiver: { id: randomUUID(), there: false },
      towBar: { id: randomUUID(), coupling: "direct", description: "Folding bar", serial: "TB-7" },
    },
    wiring: {
      style: "diodes",
      segments: [
        { from: "socket", to: "nose", gaugeAwg: 16, conductors: [{ color: "white", near: "ground" }] },
      ],
    },
    procedure: { says: "how", page: "7-21", bar: "before", endState: "As the page has it." },
    ...over,
  };
}
