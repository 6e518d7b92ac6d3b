import { describe, expect, test } from "vitest";
import { destination, localPath, signInPath } from "@/lib/client/session";
import type { Role } from "@/lib/domain/member";

describe("a path that someone left in the query string", () => {
  test.each(["/desk", "/desk/walk?id=0193a1b2-0000-7000-8000-000000000001", "/field#x", "/"])(
    "%s is ours",
    (path) => {
      expect(localPath(path)).toBe(path);
    },
  );

  test.each([
    null,
    "",
    "desk",
    "https://elsewhere.example/",
    "//elsewhere.example/",
    "///elsewhere.example/",
    "/\\elsewhere.example/",
    "\\\\elsewhere.example/",
    "/desk//elsewhere.example",
    "/desk\\elsewhere",
    "/\t/elsewhere.example/",
    "/\n/elsewhere.example/",
    "/\r\n/elsewhere.example/",
    " /desk",
    "/desk\u0000",
    "javascript:alert(1)",
  ])("%j is not", (path) => {
    expect(localPath(path)).toBeNull();
  });
});

describe("where a member goes after signing in", () => {
  const table: [Role, string | null, string][] = [
    ["driver", null, "/field"],
    ["installer", null, "/field"],
    ["manager", null, "/field"],
    ["auditor", null, "/desk"],
    ["driver", "/desk/walk?id=1", "/desk/walk?id=1"],
    ["auditor", "//elsewhere.example", "/desk"],
    ["manager", "https://elsewhere.example", "/field"],
  ];
  test.each(table)("%s headed for %j goes to %s", (role, wanted, expected) => {
    expect(destination(role, wanted)).toBe(expected);
  });

  test("the sign-in page is told where someone was, whole", () => {
    const path = signInPath({ pathname: "/desk/walk", search: "?id=a&b=c" });
    expect(path).toBe("/sign-in?then=%2Fdesk%2Fwalk%3Fid%3Da%26b%3Dc");
    expect(localPath(new URLSearchParams(path.split("?")[1]).get("then"))).toBe("/desk/walk?id=a&b=c");
  });
});
