"use client";

import { noAccountWords as words } from "@/lib/domain/messages/account";
import { useWaiting } from "./waiting";

/** The way to an account, for someone who has none. */
export function SignUpLine() {
  return (
    <p className="mt-4">
      {words.question}{" "}
      <a
        href="/sign-up"
        className="inline-flex min-h-11 items-center px-1 font-semibold underline decoration-2 underline-offset-4"
      >
        {words.signUp}
      </a>
    </p>
  );
}

/** Under the sign-in form: the way to an account, and what signing in does not take along. */
export function NoAccount() {
  const waiting = useWaiting();
  return (
    <>
      <SignUpLine />
      {waiting && <p className="mt-2 border-t-hair border-rule pt-3 text-base text-soft">{words.stays}</p>}
    </>
  );
}
