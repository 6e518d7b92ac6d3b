import { expect, test } from "vitest";
import { APP } from "@/lib/domain/version";
import manifest from "@/package.json";

test("an entry's app is this package and version", () => {
  expect(APP).toBe(`${manifest.name} ${manifest.version}`);
});
