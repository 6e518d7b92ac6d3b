import { StoreTroubleNotice } from "@/components/settings/store-trouble-notice";
import type { HeldRecord } from "@/lib/client/record-export";
import { storeTroubleOf } from "@/lib/client/store-trouble";
import { fieldWords } from "@/lib/domain/messages/field";
import { Trouble } from "./trouble";

type SaveTroubleProps = {
  /** What was thrown when something was to be saved; null where nothing was. */
  error: unknown;
  /** The walk in memory, to be taken away as a file. */
  held?: () => HeldRecord;
};

/** Why something was not saved, and what to do about it. */
export function SaveTrouble({ error, held }: SaveTroubleProps) {
  if (error === null) return null;
  const trouble = storeTroubleOf(error);
  if (!trouble) return <Trouble>{fieldWords.walk.movedOn}</Trouble>;
  return <StoreTroubleNotice trouble={trouble} held={held} />;
}
