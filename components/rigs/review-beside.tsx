"use client";

import { useQuery } from "@tanstack/react-query";
import { rigQuery } from "@/lib/client/rig-queries";
import { besideWords as words } from "@/lib/domain/messages/review";
import { sheetIn, type Sheet } from "@/lib/domain/sheet/sheet";
import { UUID } from "@/lib/domain/uuid";
import { Notice } from "../ui/notice";
import { Fetched } from "./fetched";
import { ReviewDifferences } from "./review-differences";

/** A rig by its name and the sheet that its list follows from. */
export type Named = { name: string; sheet: Sheet };

/** One rig's list beside that of another, which is fetched. */
export function ReviewBeside({ one, beside }: { one: Named; beside: string }) {
  const query = useQuery(rigQuery(beside));
  const gone = <Notice tone="plain">{words.goneOther}</Notice>;
  if (!UUID.test(beside)) return gone;
  return (
    <Fetched query={query} label={words.fetching} gone={gone}>
      {({ name, document }) => {
        const sheet = sheetIn(document);
        if (sheet === null) return <Notice tone="plain">{words.noSheet}</Notice>;
        return <ReviewDifferences one={one} other={{ name, sheet }} />;
      }}
    </Fetched>
  );
}
