import * as z from "zod/mini";
import { uuidShape } from "./shapes";

export const organisationKinds = ["household", "shop", "fleet"] as const;
export const roles = ["driver", "installer", "manager", "auditor"] as const;

export type OrganisationKind = (typeof organisationKinds)[number];
export type Role = (typeof roles)[number];

/** A member as the member sees themselves. */
export const memberShape = z.object({
  id: uuidShape,
  name: z.string(),
  email: z.string(),
  role: z.enum(roles),
  organisation: z.object({ id: uuidShape, name: z.string(), kind: z.enum(organisationKinds) }),
});
export type Member = z.infer<typeof memberShape>;

/** What someone types to sign in. */
export const credentialsShape = z.object({
  email: z.string().check(z.trim(), z.minLength(1, "Enter your email address."), z.maxLength(254)),
  password: z.string().check(z.minLength(1, "Enter your password."), z.maxLength(1024)),
});
export type Credentials = z.infer<typeof credentialsShape>;
