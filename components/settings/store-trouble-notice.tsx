import { Notice } from "@/components/ui/notice";
import { exportHeld, type HeldRecord } from "@/lib/client/record-export";
import type { StoreTrouble } from "@/lib/client/store-trouble";
import { storeWords } from "@/lib/domain/messages/settings";
import { ExportButton } from "./export-button";

type StoreTroubleNoticeProps = {
  trouble: StoreTrouble;
  /** The walk that this page holds in memory, `recorder.held`: it can be exported whatever the store does. */
  held?: () => HeldRecord;
};

/** What is wrong with the phone's store, what to do, and the way to take the walk away as a file. */
export function StoreTroubleNotice({ trouble, held }: StoreTroubleNoticeProps) {
  const { title, text } = storeWords[trouble];
  return (
    <div role="alert" data-trouble={trouble}>
      <Notice tone="caution" title={title}>
        <p>{text}</p>
        {held && (
          <div className="pt-3">
            <ExportButton file={async () => exportHeld(held())} />
          </div>
        )}
      </Notice>
    </div>
  );
}
