import { buildForTests, checkTypes, format, lint } from "./test-checks";
import { prepareTests } from "./test-machine";
import { runPlaywright, runVitest } from "./test-runs";
import { runScript } from "./shutdown";

/**
 * What a stage found: how many tests or checks passed and failed, what to read when any failed, and how many passed
 * at the second try only.
 */
export type Outcome = { passed: number; failed: number; output: string; again?: number };

type Stage = { name: string; groups: string[]; run: (words: string[]) => Promise<Outcome> };

// `npm test -- types unit` runs these only; other words narrow the files of the test stages.
const rooms = [".", "lib/domain", "lib/client", "lib/server", "service-worker"];
const stages: Stage[] = [
  { name: "format", groups: ["static"], run: format },
  { name: "lint", groups: ["static"], run: lint },
  ...rooms.map((room) => ({
    name: `types ${room}`,
    groups: ["static", "types"],
    run: () => checkTypes(room),
  })),
  ...["domain", "client", "scripts", "server"].map((place) => ({
    name: place,
    groups: ["unit"],
    run: (words: string[]) => runVitest(place, words),
  })),
  { name: "build", groups: ["static", "e2e"], run: buildForTests },
  { name: "e2e", groups: [], run: runPlaywright },
];

await runScript(async () => {
  const { chosen, words } = choose(process.argv.slice(2));
  const broken = await prepareTests(chosen.map(({ name }) => name));
  const total = { passed: 0, failed: 0 };
  for (const { name, run } of chosen) {
    const began = Date.now();
    const why = broken(name);
    const outcome: Outcome = why ? { passed: 0, failed: 1, output: why } : await run(words);
    const { passed, failed, output, again = 0 } = outcome;
    total.passed += passed;
    total.failed += failed;
    const seconds = ((Date.now() - began) / 1000).toFixed(1);
    if (failed > 0 || again > 0) console.log(output.trimEnd());
    console.log(
      `${failed > 0 ? "FAIL" : "ok  "}  ${name.padEnd(22)} ${count(passed, failed, again)}  ${seconds} s`,
    );
  }
  console.log(`${total.passed} passed, ${total.failed} failed`);
  return total.failed === 0 && total.passed > 0 ? 0 : 1;
}, 1);

function choose(asked: string[]): { chosen: Stage[]; words: string[] } {
  const known = (word: string) => stages.filter(({ name, groups }) => name === word || groups.includes(word));
  const wanted = new Set(asked.flatMap(known));
  const words = asked.filter((word) => known(word).length === 0);
  return { chosen: wanted.size > 0 ? stages.filter((stage) => wanted.has(stage)) : stages, words };
}

function count(passed: number, failed: number, again: number): string {
  const more = (failed > 0 ? `, ${failed} failed` : "") + (again > 0 ? `, ${again} at the second try` : "");
  return `${String(passed).padStart(5)} passed${more}`;
}
