"use client";

import { useMutation, useQueryClient } from "@tanstack/react-query";
import { useState } from "react";
import { Refused } from "@/lib/client/desk-queries";
import { invitationsQuery, invite } from "@/lib/client/invitations";
import { invitedAs } from "@/lib/domain/invitation";
import type { Member, Role } from "@/lib/domain/member";
import { peopleWords as words, roleOption } from "@/lib/domain/messages/people";
import { Choice } from "../settings/choice";
import { Button } from "../ui/button";
import { InvitationLink } from "./invitation-link";

/** Makes an invitation's link, to one of the roles that this kind of organisation has. */
export function InviteForm({ member }: { member: Member }) {
  const offered = invitedAs[member.organisation.kind];
  const [role, setRole] = useState<Role>(offered[0]!);
  const queries = useQueryClient();
  const { mutate, data, error, isPending, reset } = useMutation({
    mutationFn: invite,
    networkMode: "always",
    onSuccess: () => queries.invalidateQueries({ queryKey: invitationsQuery.queryKey }),
  });
  const choose = (chosen: Role) => {
    setRole(chosen);
    reset();
  };
  return (
    <section className="flex flex-col items-start gap-4">
      <h2 className="text-xl leading-tight font-extrabold">{words.invite}</h2>
      <div className="w-full [&_legend]:text-base">
        <Choice
          title={words.as}
          options={Object.fromEntries(offered.map((each) => [each, roleOption(each)]))}
          value={role}
          onChoose={choose}
        />
      </div>
      <Button
        variant="good"
        size="desk"
        aria-disabled={isPending || undefined}
        onClick={() => !isPending && mutate(role)}
      >
        {isPending ? words.making : words.make}
      </Button>
      {error && (
        <p role="alert" className="font-semibold">
          {error instanceof Refused ? error.problem.title : words.failed}
        </p>
      )}
      {data && <InvitationLink key={data.id} made={data} />}
    </section>
  );
}
