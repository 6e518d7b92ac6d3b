import { buttonClass } from "@/components/ui/button";
import { EmptyState } from "@/components/ui/empty-state";
import { fieldWords } from "@/lib/domain/messages/field";
import { FieldFrame, LargeTitle } from "./field-frame";

const words = fieldWords.offline;

/** Stands in for a page that needs the network; the way on is what works without one. */
export function OfflineScreen() {
  return (
    <FieldFrame>
      <LargeTitle>{words.title}</LargeTitle>
      <EmptyState
        title={words.body}
        action={
          <a href="/field" className={`${buttonClass("plain")} px-6`}>
            {words.toField}
          </a>
        }
      />
    </FieldFrame>
  );
}
