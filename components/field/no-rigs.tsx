import { buttonClass } from "@/components/ui/button";
import { EmptyState } from "@/components/ui/empty-state";
import { Skeleton } from "@/components/ui/skeleton";
import type { SyncView } from "@/lib/client/sync";
import { fieldWords } from "@/lib/domain/messages/field";

const words = fieldWords.none;
export const SIGN_IN = "/sign-in?then=/field";
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
        <a href={SIGN_IN} className={look}>
          {fieldWords.rigs.signIn}
        </a>
      }
    >
      {children}
    </EmptyState>
  );
}
