import { afterAll, afterEach } from "vitest";

type Method = "log" | "info" | "warn" | "error" | "debug";
type Line = { method: Method; text: string };

const printed: Line[] = [];
const expected: { method: Method; pattern: RegExp }[] = [];

const methods = ["log", "info", "warn", "error", "debug"] as const;
const record =
  (method: Method) =>
  (...words: unknown[]) => {
    printed.push({ method, text: words.map(asText).join(" ") });
  };
Object.assign(console, Object.fromEntries(methods.map((method) => [method, record(method)])));

/** Says that this test makes the console print a matching line; without one the test fails. */
export function expectConsole(method: Method, pattern: RegExp): void {
  expected.push({ method, pattern });
}

afterEach(judge);
// What is printed while a file loads, or after its last test, belongs to the file.
afterAll(judge);

function judge(): void {
  const lines = printed.splice(0);
  const wanted = expected.splice(0);
  const matches = (line: Line, { method, pattern }: (typeof wanted)[number]) =>
    line.method === method && pattern.test(line.text);
  const surplus = lines.filter((line) => !wanted.some((want) => matches(line, want)));
  const missing = wanted.filter((want) => !lines.some((line) => matches(line, want)));
  if (surplus.length === 0 && missing.length === 0) return;
  throw new Error(
    [
      ...surplus.map(({ method, text }) => `Unexpected console.${method}: ${text}`),
      ...missing.map(
        ({ method, pattern }) => `Expected console.${method} to match ${pattern}, but nothing did.`,
      ),
    ].join("\n"),
  );
}

function asText(word: unknown): string {
  if (word instanceof Error) return word.stack ?? word.message;
  return typeof word === "string" ? word : JSON.stringify(word);
}
