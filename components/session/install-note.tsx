"use client";

import { useSyncExternalStore } from "react";
import { installNow, promptInstall, subscribeInstall, type InstallSituation } from "@/lib/client/install";
import { installWords } from "@/lib/domain/messages/settings";
import { Button } from "../ui/button";

/** What installing means in this browser; null until the page runs in one. */
export function useInstallSituation(): InstallSituation | null {
  return useSyncExternalStore(subscribeInstall, installNow, () => null);
}

/**
 * Where the installed app has storage of its own: that it is to be installed first, in three steps. A sign-in here
 * would be one for this browser only.
 */
export function InstallFirst({ title }: { title: string }) {
  return (
    <section className="border-y-hair border-rule bg-shade px-4 py-4">
      <h2 className="text-xl leading-snug font-extrabold">{title}</h2>
      <p className="mt-1">{installWords.why}</p>
      <div className="mt-3 flex flex-wrap items-center gap-x-5 gap-y-2">
        <ShareSign />
        <ol aria-label={installWords.stepsTitle} className="flex min-w-0 flex-[1_1_12rem] flex-col gap-1.5">
          {installWords.steps.map((step, at) => (
            <li key={step} className="flex gap-3">
              <span aria-hidden="true" className="tabular font-semibold">
                {at + 1}
              </span>
              <span>{step}</span>
            </li>
          ))}
        </ol>
      </div>
    </section>
  );
}

/** Elsewhere: that a browser may clear what was not installed, with the browser's own offer where it makes one. */
export function InstallAdvice({ offered }: { offered: boolean }) {
  if (!offered) return <p className="text-base text-soft">{installWords.plain}</p>;
  return (
    <div className="flex flex-col items-start gap-3">
      <p className="text-base text-soft">{installWords.offered}</p>
      <Button variant="plain" className="px-6" onClick={() => void promptInstall()}>
        {installWords.button}
      </Button>
    </div>
  );
}

/** The sign for Share on phones of that make, as something to look for. */
function ShareSign() {
  return (
    <svg role="img" aria-label={installWords.picture} viewBox="0 0 72 84" className="dr max-w-18 shrink-0">
      <path className="dr-part dr-open" d="M24 34H14v42h44V34H48" />
      <path className="dr-part dr-open" d="M36 56V8M24 20 36 8l12 12" />
    </svg>
  );
}
