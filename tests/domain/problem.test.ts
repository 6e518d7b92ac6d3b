import { expect, test } from "vitest";
import { Problem, problemDocument, problems, problemShape, type ProblemCode } from "@/lib/domain/problem";

test("every code has its status", () => {
  const statuses = Object.entries(problems).map(([code, { status }]) => `${status} ${code}`);
  expect(statuses).toEqual([
    "403 foreign-origin",
    "401 signed-out",
    "401 wrong-credentials",
    "403 role-refused",
    "400 not-json",
    "413 too-large",
    "422 wrong-shape",
    "404 not-found",
    "409 device-taken",
    "409 address-taken",
    "409 id-taken",
    "409 stale-base",
    "422 newer-schema",
    "422 impossible-sheet",
    "429 too-many-attempts",
    "403 bad-link",
    "415 wrong-media",
    "422 wrong-content",
    "503 unavailable",
    "500 internal",
  ]);
});

test.each(Object.keys(problems) as ProblemCode[])("%s is an RFC 9457 document", (code) => {
  const plain = problemDocument(new Problem(code));
  expect(plain).toEqual({ type: "about:blank", code, ...problems[code] });
  const extra = { detail: "more", errors: [{ pointer: "/a", detail: "b" }] };
  const full = problemDocument(new Problem(code, { ...extra, retryAfterS: 5 }));
  expect(full).toEqual({ ...plain, ...extra });
  for (const document of [plain, full]) expect(problemShape.parse(document)).toEqual(document);
});
