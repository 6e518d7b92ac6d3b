import { useEffect, type RefObject } from "react";
import { fieldWords } from "@/lib/domain/messages/field";
import { hasMoved } from "./address";

/** Names the document after the screen that shows. */
export function useScreenTitle(screen: string): void {
  useEffect(() => {
    document.title = fieldWords.documentTitle(screen);
  }, [screen]);
}

let anyScreenBefore = false;

/**
 * Moves the focus to a screen's heading when the screen changes, so that keyboard and screen reader go on from there.
 * The first screen of a page load leaves the focus where the browser put it.
 * @param appearance what makes it another screen
 */
export function useArrival(heading: RefObject<HTMLElement | null>, appearance: string): void {
  useEffect(() => {
    if (anyScreenBefore) heading.current?.focus({ preventScroll: true });
    anyScreenBefore = true;
  }, [heading, appearance]);
}

/** The same for a screen that is prerendered, and so is mounted before the address is known: only after a move. */
export function useReturn(heading: RefObject<HTMLElement | null>): void {
  useEffect(() => {
    if (hasMoved()) heading.current?.focus({ preventScroll: true });
  }, [heading]);
}
