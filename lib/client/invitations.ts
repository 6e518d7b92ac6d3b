import { queryOptions } from "@tanstack/react-query";
import * as z from "zod/mini";
import {
  invitationListShape,
  invitationReadingShape,
  madeInvitationShape,
  peopleShape,
  TOKEN,
  type InvitationReading,
  type Join,
  type MadeInvitation,
} from "../domain/invitation";
import { memberShape, type Member, type Role } from "../domain/member";
import { call, type Answer, type Fetch } from "./api";
import { read, valueOf } from "./desk-queries";

export const peopleQuery = queryOptions({
  queryKey: ["people"],
  queryFn: async () => (await read(peopleShape, "/api/members")).members,
});

export const invitationsQuery = queryOptions({
  queryKey: ["invitations"],
  queryFn: async () => (await read(invitationListShape, "/api/invitations")).invitations,
});

/** Makes an invitation. */
export async function invite(role: Role): Promise<MadeInvitation> {
  return valueOf(await call(madeInvitationShape, "POST", "/api/invitations", { role }));
}

/** Withdraws an invitation; one that is gone already is withdrawn as well. */
export async function withdraw(id: string): Promise<void> {
  const answer = await call<void>(null, "DELETE", `/api/invitations/${id}`);
  if (answer.kind === "refused" && answer.problem.code === "not-found") return;
  valueOf(answer);
}

/** The token in a link's query string, or null where none can be. */
export function tokenIn(search: string): string | null {
  const token = new URLSearchParams(search).get("token");
  return token !== null && TOKEN.test(token) ? token : null;
}

/** What a link invites to. */
export function invitation(token: string, fetch?: Fetch): Promise<Answer<InvitationReading>> {
  return call(invitationReadingShape, "GET", `/api/join/${token}`, undefined, fetch);
}

/** Becomes a member by a link, and is signed in. */
export function join(token: string, form: Join, fetch?: Fetch): Promise<Answer<{ member: Member }>> {
  return call(z.object({ member: memberShape }), "POST", `/api/join/${token}`, form, fetch);
}
