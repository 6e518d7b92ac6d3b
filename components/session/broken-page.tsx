"use client";

import { brokenWords } from "@/lib/domain/messages/session";
import { Button, buttonClass } from "../ui/button";
import { PlainPage } from "./plain-page";

/** What stands in for a page that threw. */
export function BrokenPage({ retry }: { retry: () => void }) {
  return (
    <PlainPage>
      <h1 className="text-[1.875rem] leading-[1.1] font-extrabold">{brokenWords.title}</h1>
      <p className="mt-2 text-soft">{brokenWords.text}</p>
      <div className="mt-6 flex flex-wrap gap-2.5">
        <Button variant="good" size="desk" onClick={retry}>
          {brokenWords.again}
        </Button>
        {/* A document of its own: what is broken in this one stays behind. */}
        {/* eslint-disable-next-line @next/next/no-html-link-for-pages */}
        <a href="/" className={buttonClass("plain", "desk")}>
          {brokenWords.front}
        </a>
      </div>
    </PlainPage>
  );
}
