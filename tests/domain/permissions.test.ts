import { expect, test } from "vitest";
import { roles } from "@/lib/domain/member";
import { actions, may } from "@/lib/domain/permissions";

test("who may do what", () => {
  const table = Object.fromEntries(
    roles.map((role) => [role, actions.filter((action) => may(role, action))]),
  );
  expect(table).toEqual({
    driver: ["walks.record", "walks.read-own", "devices.register", "rigs.read"],
    installer: [
      "walks.record",
      "walks.read-own",
      "walks.read-all",
      "devices.register",
      "rigs.read",
      "rigs.write",
    ],
    manager: [
      "walks.record",
      "walks.read-own",
      "walks.read-all",
      "devices.register",
      "rigs.read",
      "rigs.write",
      "people.invite",
    ],
    auditor: ["walks.read-own", "walks.read-all", "devices.register", "rigs.read"],
  });
});
