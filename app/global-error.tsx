"use client";

import { BrokenPage } from "@/components/session/broken-page";
import { brokenWords } from "@/lib/domain/messages/session";
import { fontVariables } from "./fonts";
import "./globals.css";

/** Stands in for the whole document when the layout itself failed. */
export default function GlobalError({ retry }: { retry: () => void }) {
  return (
    <html lang="en-US" className={fontVariables}>
      <body className="font-sans">
        <title>{brokenWords.title}</title>
        <BrokenPage retry={retry} />
      </body>
    </html>
  );
}
