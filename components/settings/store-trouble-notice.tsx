import { theField } from "@/components/field/browser-field";
import { Notice } from "@/components/ui/notice";
import { exportAll, exportHeld, type HeldRecord } from "@/lib/client/record-export";
import type { StoreTrouble } from "@/lib/client/store-trouble";
import { settingsWords, storeWords } from "@/lib/domain/messages/settings";
import { ExportButton } from "./export-button";

type StoreTroubleNoticeProps = {
  trouble: StoreTrouble;
  /** The walk that this page holds in memory, `recorder.held`: it can be exported whatever the store does. */
  held?: () => HeldRecord;
};

/**
 * What is wrong with the phone's store, what to do, and the way to take the walk away as a file; without one, all that
 * can still be read.
 */
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
        {!held && trouble !== "refused" && (
          <div className="pt-3">
            <ExportButton
              label={settingsWords.storage.exportAll}
              file={() => exportAll(theField().sync.shelf, Date.now())}
            />
          </div>
        )}
      </Notice>
    </div>
  );
}
