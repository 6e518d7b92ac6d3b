import type { MouseEvent } from "react";
import type { CalloutLetter } from "@/lib/domain/messages/drawings";
import { nearestOf, type Stretch } from "./nearest";

/** What a callout's group carries, so that a touch on one can be weighed against all the others of its drawing. */
export function reachAttributes(letter: CalloutLetter, stretches: readonly Stretch[]) {
  return { "data-callout": letter, "data-reach": JSON.stringify(stretches) };
}

/** The callout nearest to a touch, in the drawing's own units. */
export function calloutAt(event: MouseEvent<SVGGElement>): CalloutLetter | undefined {
  const drawing = event.currentTarget.ownerSVGElement;
  const toDrawing = drawing?.getScreenCTM()?.inverse();
  if (!drawing || !toDrawing) return undefined;
  const { x, y } = new DOMPoint(event.clientX, event.clientY).matrixTransform(toDrawing);
  const callouts = [...drawing.querySelectorAll<SVGGElement>("[data-callout]")].map(({ dataset }) => ({
    key: dataset.callout as CalloutLetter,
    stretches: JSON.parse(dataset.reach ?? "[]") as Stretch[],
  }));
  return nearestOf(x, y, callouts);
}
