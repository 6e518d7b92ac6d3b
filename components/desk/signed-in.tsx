"use client";

import { useState } from "react";
import { leaveFor, signOut } from "@/lib/client/session";
import type { Member } from "@/lib/domain/member";
import { deskWords } from "@/lib/domain/messages/desk";

/** Who is signed in, and the way out. */
export function SignedIn({ member }: { member: Member }) {
  const [state, setState] = useState<"in" | "leaving" | "stuck">("in");
  const leave = async () => {
    setState("leaving");
    const answer = await signOut();
    const gone = answer.kind === "answered" || (answer.kind === "refused" && answer.problem.status === 401);
    if (gone) leaveFor("/sign-in");
    else setState("stuck");
  };
  return (
    <div className="mt-3 border-t-hair border-rule pt-3 text-base leading-snug">
      <p className="font-semibold">{member.name}</p>
      <p className="text-soft">{deskWords.who(member.role, member.organisation.name)}</p>
      <button
        type="button"
        onClick={() => void leave()}
        aria-disabled={state === "leaving" || undefined}
        className="-ml-1 inline-flex min-h-11 items-center px-1 font-semibold underline decoration-2 underline-offset-4"
      >
        {state === "leaving" ? deskWords.signingOut : deskWords.signOut}
      </button>
      {state === "stuck" && (
        <p role="alert" className="font-semibold">
          {deskWords.signOutFailed}
        </p>
      )}
    </div>
  );
}
