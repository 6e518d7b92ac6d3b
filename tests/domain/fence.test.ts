import { ESLint } from "eslint";
import { describe, expect, test } from "vitest";

const eslint = new ESLint();

async function problems(room: string, imported: string): Promise<(string | null)[]> {
  const [result] = await eslint.lintText(`import * as reached from "${imported}";\nexport { reached };\n`, {
    filePath: `${room}/fence-probe.ts`,
  });
  return result!.messages.map((message) => message.ruleId);
}

describe("the fence between the rooms", () => {
  test.each([
    ["lib/domain", "@/lib/client/store"],
    ["lib/domain", "../server/settings"],
    ["lib/domain", "@/models/index"],
    ["lib/client", "@/lib/server/settings"],
    ["lib/client", "@/components/ui/button"],
    ["lib/server", "@/lib/client/store"],
    ["models", "@/lib/server/settings"],
    ["components/ui", "@/lib/server/settings"],
    ["components/ui", "@/app/fonts"],
    ["app/api", "@/components/ui/button"],
    ["service-worker", "@/lib/server/settings"],
  ])("%s may not import %s", async (room, imported) => {
    expect(await problems(room, imported)).toEqual(["import/no-restricted-paths"]);
  });

  test.each([
    ["lib/domain", "./entry"],
    ["lib/client", "@/lib/domain/entry"],
    ["lib/server", "@/models/index"],
    ["components/ui", "@/lib/client/store"],
    ["app/api", "@/lib/server/settings"],
    ["service-worker", "@/lib/domain/entry"],
  ])("%s may import %s", async (room, imported) => {
    expect(await problems(room, imported)).toEqual([]);
  });
});
