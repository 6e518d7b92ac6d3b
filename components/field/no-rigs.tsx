import { buttonClass } from "@/components/ui/button";
import { EmptyState } from "@/components/ui/empty-state";
import { Skeleton } from "@/components/ui/skeleton";
import type { SyncView } from "@/lib/client/sync";
import { noAccountWords } from "@/lib/domain/messages/account";
import { fieldWords } from "@/lib/domain/messages/field";
import { NEW_RIG } from "./address";
import { WingLink } from "./wing-link";

const words = fieldWords.none;
export const SIGN_IN = "/sign-in?then=/field";
export const SIGN_UP = "/sign-up";
const look = `${buttonClass("plain")} px-6`;

/** What stands where the rigs will be, before this phone has any. */
export function NoRigs({ sync }: { sync: SyncView }) {
  if (sync.roleRefused) {
    return (
      <EmptyState
        title={words.auditorTitle}
        action={
          <a href="/desk" className={look}>
            {words.toDesk}
          </a>
        }
      >
        {words.auditor}
      </EmptyState>
    );
  }
  if (sync.signedOut) return <SignInFirst title={words.signedOutTitle}>{words.signedOut}</SignInFirst>;
  if (sync.reached === null) {
    return (
      <div className="px-4">
        <Skeleton label={words.fetching} />
      </div>
    );
  }
  return (
    <SignInFirst title={words.unreachedTitle}>
      {words.unreached} {words.trying}
    </SignInFirst>
  );
}

function SignInFirst({ title, children }: { title: string; children: React.ReactNode }) {
  return (
    <EmptyState
      title={title}
      action={
        <div className="flex max-w-full flex-col items-start gap-3">
          <div className="flex max-w-full flex-wrap gap-2.5">
            <a href={SIGN_IN} className={`${buttonClass("good")} px-4`}>
              {fieldWords.rigs.signIn}
            </a>
            <WingLink at={NEW_RIG} className={`${buttonClass("plain")} px-4`}>
              {noAccountWords.start}
            </WingLink>
          </div>
          <p className="max-w-prose text-base text-soft">{noAccountWords.startHint}</p>
        </div>
      }
    >
      {children}
    </EmptyState>
  );
}
