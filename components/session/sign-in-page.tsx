"use client";

import { useEffect, useState } from "react";
import { reloadWhenRestored, whoAmI } from "@/lib/client/session";
import type { Member } from "@/lib/domain/member";
import { signInWords } from "@/lib/domain/messages/session";
import { installWords } from "@/lib/domain/messages/settings";
import { InstallAdvice, InstallFirst, useInstallSituation } from "./install-note";
import { NoAccount } from "./no-account";
import { PlainPage } from "./plain-page";
import { SignInForm } from "./sign-in-form";
import { SignedInNote } from "./signed-in-note";

/** Sign-in: the form, and above it who is signed in already. */
export function SignInPage() {
  const [member, setMember] = useState<Member | null>(null);
  const situation = useInstallSituation();
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
        <h2 className="text-xl leading-tight font-extrabold">{signInWords.other}</h2>
      ) : (
        <>
          <h1 className="text-[1.875rem] leading-[1.1] font-extrabold">{signInWords.title}</h1>
          <p className="mt-2 text-soft">{signInWords.lead}</p>
        </>
      )}
      {!member && situation === "own-store" && (
        <div className="mt-6">
          <InstallFirst title={installWords.title} />
        </div>
      )}
      <SignInForm />
      <NoAccount />
      {(situation === "plain" || situation === "offered") && (
        <div className="mt-8 border-t-hair border-rule pt-4">
          <InstallAdvice offered={situation === "offered"} />
        </div>
      )}
    </PlainPage>
  );
}
