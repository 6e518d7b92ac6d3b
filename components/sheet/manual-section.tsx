import { Notice } from "@/components/ui/notice";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import { useDraftDesk } from "./draft-context";
import { PartFields } from "./part-fields";

/** What the owner's manual of this car says, in the words of whoever read it. */
export function ManualSection() {
  const { sheet } = useDraftDesk();
  const says = sheet.procedure?.says;
  return (
    <>
      <Notice>
        <p className="max-w-prose">{words.manualCaution}</p>
        <p className="mt-2 max-w-prose">{words.manualHurts}</p>
      </Notice>
      <PartFields part="procedure" alone />
      <div role="status">
        {says === "forbidden" && <Notice tone="plain">{words.forbidden}</Notice>}
        {(says === "not-recorded" || says === null) && <Notice tone="plain">{words.notRecorded}</Notice>}
      </div>
    </>
  );
}
