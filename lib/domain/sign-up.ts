import * as z from "zod/mini";
import { signUpErrors as say } from "./messages/account";
import { revisionShape } from "./revision";
import { uuidShape } from "./shapes";

/** The most and the least of a sign-up. */
export const SIGN_UP = { rigs: 5, bytes: 1024 * 1024, passwordLeast: 15, name: 100 } as const;

const nameShape = (missing: string) =>
  z.string().check(z.trim(), z.minLength(1, missing), z.maxLength(SIGN_UP.name, say.long));

const emailShape = z
  .string()
  .check(z.trim(), z.minLength(1, say.email), z.maxLength(254, say.long))
  .check(z.regex(/^([^\s@]+@[^\s@]+)?$/, say.emailForm));

/** A password is long, and nothing else: any characters, spaces too. Counted as a person counts, not in code units. */
const passwordShape = z
  .string()
  .check(z.maxLength(1024, say.long))
  .check(z.refine((text) => [...text].length >= SIGN_UP.passwordLeast, say.passwordShort));

/** What someone types to sign up. */
export const signUpFormShape = z.object({
  name: nameShape(say.name),
  household: nameShape(say.household),
  email: emailShape,
  password: passwordShape,
});
export type SignUpForm = z.infer<typeof signUpFormShape>;

/**
 * A sign-up as it is sent. A phone that was used without an account brings the member id that its walks name and the
 * rigs that it made; both keep their ids, so that every walk goes on to check untouched.
 */
export const signUpShape = z.extend(signUpFormShape, {
  member: z.optional(uuidShape),
  rigs: z.optional(
    z
      .array(z.object({ id: uuidShape, name: nameShape(say.rig), document: revisionShape }))
      .check(z.maxLength(SIGN_UP.rigs, say.rigs))
      .check(z.refine((rigs) => new Set(rigs.map(({ id }) => id)).size === rigs.length, say.twice)),
  ),
});
export type SignUp = z.infer<typeof signUpShape>;
