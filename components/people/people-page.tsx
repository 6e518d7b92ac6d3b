"use client";

import { useQuery } from "@tanstack/react-query";
import { whoQuery } from "@/lib/client/desk-queries";
import { peopleQuery } from "@/lib/client/invitations";
import type { Member } from "@/lib/domain/member";
import { peopleWords as words } from "@/lib/domain/messages/people";
import { may } from "@/lib/domain/permissions";
import { DeskHeading } from "../desk/desk-heading";
import { Trouble } from "../desk/trouble";
import { Skeleton } from "../ui/skeleton";
import { InviteForm } from "./invite-form";
import { OpenInvitations } from "./open-invitations";

/** Who belongs to the organisation, and the way to let someone else in. */
export function PeoplePage() {
  const { data: member, error, isFetching, refetch } = useQuery(whoQuery);
  return (
    <>
      <DeskHeading title={words.title} sub={member && words.sub(member.organisation.name)} />
      {member ? (
        <Inside member={member} />
      ) : error ? (
        <Trouble error={error} retry={() => void refetch()} busy={isFetching} />
      ) : (
        <Skeleton label={words.fetching} />
      )}
    </>
  );
}

function Inside({ member }: { member: Member }) {
  if (!may(member.role, "people.invite")) return <p className="max-w-prose">{words.notYours}</p>;
  return (
    <div className="flex max-w-[44rem] flex-col gap-8">
      <Members member={member} />
      <InviteForm member={member} />
      <OpenInvitations />
    </div>
  );
}

function Members({ member }: { member: Member }) {
  const { data, error, isFetching, refetch } = useQuery(peopleQuery);
  if (!data && error) return <Trouble error={error} retry={() => void refetch()} busy={isFetching} />;
  if (!data) return <Skeleton label={words.fetching} />;
  return (
    <section>
      <h2 className="text-xl leading-tight font-extrabold">{words.members}</h2>
      <ul className="mt-2 border-t-hair border-rule">
        {data.map(({ id, name, role }) => (
          <li
            key={id}
            className="flex min-h-11 flex-wrap items-center justify-between gap-x-6 border-b-hair border-rule py-2"
          >
            <span className="min-w-0 font-semibold [overflow-wrap:anywhere]">
              {name}
              {id === member.id && <span className="font-normal text-soft"> ({words.you})</span>}
            </span>
            <span className="text-soft">{words.role(role)}</span>
          </li>
        ))}
      </ul>
    </section>
  );
}
