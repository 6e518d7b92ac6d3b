import * as z from "zod/mini";
import { memberShape } from "@/lib/domain/member";
import { SIGN_UP, signUpShape } from "@/lib/domain/sign-up";
import { contract } from "../contract";

export const signUp = contract({
  method: "POST",
  path: "/api/sign-up",
  summary:
    "Make a household with its first member, its manager, and sign in. `member` and `rigs` are what a phone made before: " +
    "they keep their ids, and walks that name them can be sent afterwards.",
  public: true,
  body: { shape: signUpShape, limit: SIGN_UP.bytes },
  answers: { 201: { json: z.object({ member: memberShape }) } },
  problems: ["address-taken", "id-taken", "too-many-attempts"],
});
