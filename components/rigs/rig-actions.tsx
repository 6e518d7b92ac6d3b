"use client";

import Link from "next/link";
import { useState } from "react";
import { handOver } from "@/lib/client/record-export";
import { sheetFile } from "@/lib/client/sheet-file";
import { rigWords as words } from "@/lib/domain/messages/rigs";
import type { RigReading } from "@/lib/domain/rigs";
import type { Sheet } from "@/lib/domain/sheet/sheet";
import { Button, buttonClass } from "../ui/button";

type RigActionsProps = { reading: RigReading; sheet: Sheet | null };

/** What can be done with a rig: edit its sheet, take it along as a file or on paper, go on to the walks. */
export function RigActions({ reading, sheet }: RigActionsProps) {
  const [said, setSaid] = useState("");
  const take = async (of: Sheet) => {
    const file = sheetFile(of);
    try {
      const became = await handOver(file);
      setSaid(became === "downloaded" ? words.exported(file.name) : "");
    } catch {
      setSaid(words.exportFailed);
    }
  };
  return (
    <div className="print:hidden">
      <div className="flex flex-wrap gap-2.5">
        {reading.mayWrite && (
          <Link
            href={`/desk/sheet?rig=${reading.id}`}
            prefetch={false}
            className={buttonClass("good", "desk")}
          >
            {words.edit}
          </Link>
        )}
        {sheet && (
          <Button size="desk" onClick={() => void take(sheet)}>
            {words.export}
          </Button>
        )}
        <Button size="desk" onClick={() => window.print()}>
          {words.print}
        </Button>
        <Link href="/desk" prefetch={false} className={buttonClass("plain", "desk")}>
          {words.walks}
        </Link>
      </div>
      <p role="status" className="mt-1 text-base wrap-anywhere empty:hidden">
        {said}
      </p>
    </div>
  );
}
