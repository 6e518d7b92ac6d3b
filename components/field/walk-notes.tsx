import { buttonClass } from "@/components/ui/button";
import { EmptyState } from "@/components/ui/empty-state";
import { Skeleton } from "@/components/ui/skeleton";
import { fieldWords } from "@/lib/domain/messages/field";
import { FieldFrame, LargeTitle } from "./field-frame";
import { WingLink } from "./wing-link";

const words = fieldWords.walk;

/** While a walk is read from the phone's store. */
export function ReadingWalk() {
  return (
    <FieldFrame>
      <div className="px-4 pt-4">
        <Skeleton label={words.taking} rows={4} />
      </div>
    </FieldFrame>
  );
}

/** An address of a walk that this phone does not have. */
export function MissingWalk() {
  return (
    <FieldFrame>
      <LargeTitle>{words.missingTitle}</LargeTitle>
      <EmptyState
        title={words.missing}
        action={<WingLink className={`${buttonClass("plain")} px-6`}>{words.back}</WingLink>}
      />
    </FieldFrame>
  );
}

/** A browser that will not keep anything: no walk can be made here. */
export function StoreRefused() {
  return (
    <FieldFrame>
      <LargeTitle>{fieldWords.notes.storeTitle}</LargeTitle>
      <div role="alert">
        <EmptyState title={fieldWords.notes.store} />
      </div>
    </FieldFrame>
  );
}
