"use client";

import { useEffect, useState } from "react";
import { reloadWhenRestored, whoAmI } from "@/lib/client/session";
import type { Member } from "@/lib/domain/member";
import { signUpWords } from "@/lib/domain/messages/account";
import { BringAlong } from "./bring-along";
import { PlainPage } from "./plain-page";
import { SignUpForm } from "./sign-up-form";
import { SignedInNote } from "./signed-in-note";
import { useWaiting } from "./waiting";

/** Sign-up: what goes along from this phone, and the form. */
export function SignUpPage() {
  const [member, setMember] = useState<Member | null>(null);
  const waiting = useWaiting();
  useEffect(reloadWhenRestored, []);
  useEffect(() => {
    let here = true;
    void whoAmI().then((answer) => {
      if (here && answer.kind === "answered") setMember(answer.value.member);
    });
    return () => {
      here = false;
    };
  }, []);
  return (
    <PlainPage>
      {member && <SignedInNote member={member} signedOut={() => setMember(null)} />}
      {member ? (
        <h2 className="text-xl leading-tight font-extrabold">{signUpWords.other}</h2>
      ) : (
        <>
          <h1 className="text-[1.875rem] leading-[1.1] font-extrabold">{signUpWords.title}</h1>
          <p className="mt-2 text-soft">{signUpWords.lead}</p>
        </>
      )}
      {waiting && <BringAlong waiting={waiting} />}
      <SignUpForm />
      <p className="mt-6">
        {signUpWords.have}{" "}
        <a
          href="/sign-in?then=/field"
          className="inline-flex min-h-11 items-center px-1 font-semibold underline decoration-2 underline-offset-4"
        >
          {signUpWords.signIn}
        </a>
      </p>
    </PlainPage>
  );
}
