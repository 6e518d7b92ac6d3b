import { Notice } from "@/components/ui/notice";
import { Button, buttonClass } from "@/components/ui/button";
import { localWords as words } from "@/lib/domain/messages/account";
import { SIGN_UP } from "@/lib/domain/sign-up";
import { startNewRig } from "./new-rig";

/** On a phone without an account: where its rigs are, and the way to keep them. */
export function LocalNote() {
  return (
    <Notice tone="plain">
      <div className="flex flex-wrap items-center justify-between gap-3">
        <p className="min-w-0 flex-[1_1_14rem]">{words.kept}</p>
        <a href="/sign-up" className={`${buttonClass("plain")} px-6`}>
          {words.signUp}
        </a>
      </div>
    </Notice>
  );
}

/** Under the rigs of a phone without an account: what their lists are, and another one. */
export function LocalRigsFoot({ rigs }: { rigs: number }) {
  return (
    <div className="flex flex-col items-start gap-3 border-t-hair border-rule px-4 py-4">
      <p className="text-base text-soft">
        {words.lost} {words.plain}
      </p>
      {rigs < SIGN_UP.rigs ? (
        <Button variant="quiet" className="px-6" onClick={startNewRig}>
          {words.another}
        </Button>
      ) : (
        <p className="text-base text-soft">{words.full}</p>
      )}
    </div>
  );
}
