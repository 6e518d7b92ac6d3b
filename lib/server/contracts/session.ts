import * as z from "zod/mini";
import { credentialsShape, memberShape } from "@/lib/domain/member";
import { contract } from "../contract";

const answer = z.object({ member: memberShape });

export const signIn = contract({
  method: "POST",
  path: "/api/session",
  summary: "Sign in. Sets the session cookie.",
  public: true,
  body: { shape: credentialsShape, limit: 16 * 1024 },
  answers: { 200: { json: answer } },
  problems: ["wrong-credentials", "too-many-attempts"],
});

export const whoAmI = contract({
  method: "GET",
  path: "/api/session",
  summary: "Who is signed in.",
  answers: { 200: { json: answer } },
});

export const signOut = contract({
  method: "DELETE",
  path: "/api/session",
  summary: "Sign out. Clears the session cookie; again is no error.",
  public: true,
  answers: { 204: null },
});
