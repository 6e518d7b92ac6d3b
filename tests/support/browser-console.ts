import type { BrowserContext } from "@playwright/test";

/** Collects what a test's pages report as errors; Chromium reports violations of the Content-Security-Policy there. */
export function guardConsole(context: BrowserContext, isAllowed: (text: string) => boolean): string[] {
  const unexpected: string[] = [];
  const note = (text: string) => {
    if (!isAllowed(text)) unexpected.push(text);
  };
  context.on("console", (message) => {
    if (message.type() === "error") note(`${message.text()} (${message.location().url})`);
  });
  context.on("weberror", ({ error }) => note(error().stack ?? error().message));
  return unexpected;
}
