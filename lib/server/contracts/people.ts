import * as z from "zod/mini";
import {
  invitationListShape,
  invitationReadingShape,
  joinShape,
  madeInvitationShape,
  newInvitationShape,
  peopleShape,
} from "@/lib/domain/invitation";
import { memberShape } from "@/lib/domain/member";
import { contract } from "../contract";

export const listPeople = contract({
  method: "GET",
  path: "/api/members",
  summary: "The members of one's organization.",
  action: "people.invite",
  answers: { 200: { json: peopleShape } },
});

export const listInvitations = contract({
  method: "GET",
  path: "/api/invitations",
  summary: "The open invitations of one's organization, newest first.",
  action: "people.invite",
  answers: { 200: { json: invitationListShape } },
});

export const invite = contract({
  method: "POST",
  path: "/api/invitations",
  summary: "Make an invitation, good once and for seven days. Its link is told here and never again.",
  action: "people.invite",
  body: { shape: newInvitationShape, limit: 1024 },
  answers: { 201: { json: madeInvitationShape } },
});

export const withdrawInvitation = contract({
  method: "DELETE",
  path: "/api/invitations/{id}",
  summary: "Withdraw an invitation.",
  action: "people.invite",
  answers: { 204: null },
});

export const readInvitation = contract({
  method: "GET",
  path: "/api/join/{token}",
  summary: "What an invitation's link invites to.",
  public: true,
  answers: { 200: { json: invitationReadingShape } },
});

export const join = contract({
  method: "POST",
  path: "/api/join/{token}",
  summary: "Become a member by an invitation, and sign in.",
  public: true,
  body: { shape: joinShape, limit: 16 * 1024 },
  answers: { 201: { json: z.object({ member: memberShape }) } },
  problems: ["address-taken", "too-many-attempts"],
});
