import * as z from "zod/mini";
import { organisationKinds, roles, type OrganisationKind, type Role } from "./member";
import { instantShape, uuidShape } from "./shapes";
import { signUpFormShape } from "./sign-up";

/** For how long an invitation is good. */
export const INVITATION_DAYS = 7;

/** What stands in an invitation's link: 32 random bytes, base64url. */
export const TOKEN = /^[A-Za-z0-9_-]{43}$/;

/** The roles that each kind of organisation invites to, the usual one first. */
export const invitedAs: Record<OrganisationKind, readonly Role[]> = {
  household: ["driver", "manager"],
  shop: ["installer", "manager", "auditor"],
  fleet: ["driver", "manager", "auditor"],
};

export const newInvitationShape = z.strictObject({ role: z.enum(roles) });

/** An invitation that was just made. `url` is a path of ours; its token is told this once and never again. */
export const madeInvitationShape = z.object({
  id: uuidShape,
  role: z.enum(roles),
  url: z.string(),
  expiresAt: instantShape,
});
export type MadeInvitation = z.infer<typeof madeInvitationShape>;

/** An open invitation, as those who may invite see it. */
export const invitationRowShape = z.object({
  id: uuidShape,
  role: z.enum(roles),
  by: z.string(),
  expiresAt: instantShape,
});
export const invitationListShape = z.object({ invitations: z.array(invitationRowShape) });
export type InvitationRow = z.infer<typeof invitationRowShape>;

/** What whoever holds the link is told: to which organisation, as what, by whom. */
export const invitationReadingShape = z.object({
  organisation: z.object({ name: z.string(), kind: z.enum(organisationKinds) }),
  role: z.enum(roles),
  by: z.string(),
  expiresAt: instantShape,
});
export type InvitationReading = z.infer<typeof invitationReadingShape>;

/** What someone types who was invited. */
export const joinShape = z.omit(signUpFormShape, { household: true });
export type Join = z.infer<typeof joinShape>;

/** The members of an organisation, by name. */
export const peopleShape = z.object({
  members: z.array(z.object({ id: uuidShape, name: z.string(), role: z.enum(roles) })),
});
export type Person = z.infer<typeof peopleShape>["members"][number];
