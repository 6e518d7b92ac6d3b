import { Notice } from "@/components/ui/notice";
import { compose } from "@/lib/domain/catalogue/compose";
import { ruledOut } from "@/lib/domain/catalogue/rule-outs";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import { finished } from "@/lib/domain/sheet/draft";
import type { Sheet } from "@/lib/domain/sheet/sheet";
import { useDraftDesk } from "./draft-context";
import { Group } from "./part-fields";

/** What rules the rig out, and how long the lists are that follow from the sheet as it stands. */
export function WhatComesOut({ wrong }: { wrong: boolean }) {
  const { sheet: draft } = useDraftDesk();
  if (wrong) {
    return (
      <Group title={words.listTitle}>
        <p className="mt-2">{words.listWaits}</p>
      </Group>
    );
  }
  const sheet = asSaved(draft);
  const reasons = ruledOut(sheet);
  const { walks } = compose(sheet);
  const hookUp = walks["hook-up"];
  return (
    <>
      {reasons.length > 0 && (
        <div className="my-4">
          <Notice tone="hold" title={words.ruledOutTitle}>
            <p>{words.ruledOutLead}</p>
            <ul className="mt-2 list-disc pl-5">
              {reasons.map(({ code, says }) => (
                <li key={code}>{says}</li>
              ))}
            </ul>
          </Notice>
        </div>
      )}
      <Group title={words.listTitle}>
        <p className="mt-2">{words.listCount(hookUp.short.length, hookUp.full.length)}</p>
        <p>{words.listOthers(walks["re-check"].full.length, walks.unhook.full.length)}</p>
      </Group>
    </>
  );
}

// The list does not hang on the ids of things, and making new ones while a page renders would be another sheet each time.
function asSaved(draft: Sheet): Sheet {
  return finished({ ...draft }, () => "");
}
