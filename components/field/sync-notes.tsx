import { buttonClass } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import type { SyncView } from "@/lib/client/sync";
import { fieldWords } from "@/lib/domain/messages/field";
import { SIGN_IN } from "./no-rigs";

const words = fieldWords.notes;

/** What stands between this phone and the server, where someone can do something about it. */
export function SyncNotes({ sync }: { sync: SyncView }) {
  if (!sync.signedOut && !sync.roleRefused) return null;
  return (
    <div className="pb-4">
      <Notice tone="plain" live title={sync.signedOut ? words.signedOutTitle : fieldWords.none.auditorTitle}>
        <div className="flex flex-wrap items-center justify-between gap-3">
          <p className="min-w-0 flex-[1_1_14rem]">{sync.signedOut ? words.signedOut : words.auditorKept}</p>
          <a href={SIGN_IN} className={`${buttonClass("plain")} px-6`}>
            {fieldWords.rigs.signIn}
          </a>
        </div>
      </Notice>
    </div>
  );
}
