import { besideWords as words, reviewWords } from "@/lib/domain/messages/review";
import { originWords } from "@/lib/domain/messages/rigs";
import type { Check } from "@/lib/domain/revision";

/** A member of a check in words. `asks` has the questions of the checks on its list by their keys. */
export function memberWords(check: Check, member: string, asks: ReadonlyMap<string, Check>): string {
  switch (member) {
    case "effect":
      return reviewWords.effect[check.effect];
    case "kind":
      return words.kinds[check.kind];
    case "part":
      return words.drawing(check.part);
    case "side":
      return check.side ? words.sides[check.side] : words.notSaid;
    case "drawn":
      return check.drawn ? words.drawn[check.drawn] : words.asUsual;
    case "mayBeAbsent":
      return check.mayBeAbsent ? words.yes : words.no;
    case "origin":
      return check.origin ? `${originWords[check.origin.kind]}: ${check.origin.says}` : words.notSaid;
    case "touches":
      return check.touches?.map((key) => asks.get(key)?.ask ?? key).join("; ") ?? words.notSaid;
    case "measure":
      return check.measure
        ? [check.measure.ask, check.measure.beside].filter(Boolean).join(" ")
        : words.notSaid;
    case "lamps":
      return check.lamps ? words.layouts[check.lamps.layout] : words.notSaid;
    case "figures":
      return check.figures
        ? Object.entries(check.figures)
            .map(([letter, figure]) => `${letter}: ${figure}`)
            .join(", ")
        : words.notSaid;
    default:
      return text((check as Record<string, unknown>)[member]);
  }
}

function text(value: unknown): string {
  if (value === undefined) return words.notSaid;
  return typeof value === "string" ? value : JSON.stringify(value);
}
