import type { Answer } from "@/lib/client/api";
import { durationText } from "@/lib/client/time-words";
import { signUpWords as words } from "@/lib/domain/messages/account";
import { problems } from "@/lib/domain/problem";

type Refused = { field: "root" | "email"; message: string };

/**
 * What someone is told whose sign-up did not come about, and where.
 * @param answer null where the phone's own store did not answer
 */
export function refusedSignUp(answer: Exclude<Answer<unknown>, { kind: "answered" }> | null): Refused {
  if (!answer) return { field: "root", message: words.storeSilent };
  if (answer.kind === "unreached") return { field: "root", message: words.unreached };
  const { problem, retryAfterS } = answer;
  switch (problem.code) {
    case "address-taken":
      return { field: "email", message: words.addressTaken };
    case "id-taken":
      return { field: "root", message: words.idTaken };
    case "too-many-attempts":
      return {
        field: "root",
        message: words.wait(retryAfterS === null ? null : durationText(Math.max(1, retryAfterS) * 1000)),
      };
    default:
      return { field: "root", message: problems[problem.code].title };
  }
}
