"use client";

import { useEffect, useState } from "react";
import { invitation, tokenIn } from "@/lib/client/invitations";
import { reloadWhenRestored, whoAmI } from "@/lib/client/session";
import type { InvitationReading } from "@/lib/domain/invitation";
import type { Member } from "@/lib/domain/member";
import { joinWords as words } from "@/lib/domain/messages/people";
import { Button } from "../ui/button";
import { Notice } from "../ui/notice";
import { Skeleton } from "../ui/skeleton";
import { JoinForm } from "./join-form";
import { PlainPage } from "./plain-page";
import { SignedInNote } from "./signed-in-note";

type Found = "looking" | "gone" | "unreached" | { token: string; invitation: InvitationReading };

/** What an invitation's link opens: who invites to what, and the form. */
export function JoinPage() {
  const [found, setFound] = useState<Found>("looking");
  const [tries, setTries] = useState(0);
  const [member, setMember] = useState<Member | null>(null);
  useEffect(reloadWhenRestored, []);
  useEffect(() => {
    let here = true;
    void lookUp().then((outcome) => here && setFound(outcome));
    void whoAmI().then((answer) => {
      if (here && answer.kind === "answered") setMember(answer.value.member);
    });
    return () => {
      here = false;
    };
  }, [tries]);
  const again = () => {
    setFound("looking");
    setTries(tries + 1);
  };
  return (
    <PlainPage>
      {member && <SignedInNote member={member} signedOut={() => setMember(null)} />}
      {member ? (
        <h2 className="text-xl leading-tight font-extrabold">{words.title}</h2>
      ) : (
        <h1 className="text-[1.875rem] leading-[1.1] font-extrabold">{words.title}</h1>
      )}
      <Inside found={found} gone={() => setFound("gone")} again={again} />
    </PlainPage>
  );
}

type InsideProps = { found: Found; gone: () => void; again: () => void };

function Inside({ found, gone, again }: InsideProps) {
  if (found === "looking") return <Skeleton label={words.looking} />;
  if (found === "gone") {
    return (
      <div className="mt-6">
        <Notice tone="plain" live title={words.goneTitle}>
          <p>{words.gone}</p>
        </Notice>
      </div>
    );
  }
  if (found === "unreached") {
    return (
      <div className="mt-6">
        <Notice tone="plain" live title={words.unreachedTitle}>
          <p>{words.unreached}</p>
          <Button size="desk" className="mt-4" onClick={again}>
            {words.again}
          </Button>
        </Notice>
      </div>
    );
  }
  const { by, organisation, role } = found.invitation;
  return (
    <>
      <p className="mt-2 text-soft">{words.lead(by, organisation.name, role)}</p>
      <JoinForm token={found.token} gone={gone} />
    </>
  );
}

async function lookUp(): Promise<Found> {
  const token = tokenIn(window.location.search);
  if (token === null) return "gone";
  const answer = await invitation(token);
  if (answer.kind === "answered") return { token, invitation: answer.value };
  return answer.kind === "refused" && answer.problem.status === 404 ? "gone" : "unreached";
}
