"use client";

import { useState } from "react";
import { destination, leaveFor, signOut } from "@/lib/client/session";
import type { Member } from "@/lib/domain/member";
import { signInWords } from "@/lib/domain/messages/session";
import { Button } from "../ui/button";

type SignedInNoteProps = { member: Member; signedOut: () => void };

/** Says who is signed in, with the two things to do about it. */
export function SignedInNote({ member, signedOut }: SignedInNoteProps) {
  const [trouble, setTrouble] = useState(false);
  const goOn = () => {
    const wanted = new URLSearchParams(window.location.search).get("then");
    leaveFor(destination(member.role, wanted));
  };
  const leave = async () => {
    const answer = await signOut();
    const gone = answer.kind === "answered" || (answer.kind === "refused" && answer.problem.status === 401);
    if (gone) signedOut();
    else setTrouble(true);
  };
  return (
    <section className="mb-8 border-y-hair border-rule bg-shade px-4 py-4">
      <h1 className="text-xl leading-snug font-extrabold">{signInWords.already(member.name)}</h1>
      <p className="text-soft">{signInWords.who(member.role, member.organisation.name)}</p>
      <div className="mt-4 flex flex-wrap gap-2.5">
        <Button variant="good" size="desk" onClick={goOn}>
          {signInWords.goOn}
        </Button>
        <Button size="desk" onClick={() => void leave()}>
          {signInWords.signOut}
        </Button>
      </div>
      {trouble && (
        <p role="alert" className="mt-3 font-semibold">
          {signInWords.signOutUnreached}
        </p>
      )}
    </section>
  );
}
