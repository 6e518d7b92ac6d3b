import { purposes, type Purpose } from "../entry";
import { canonicalText } from "../json";
import { checksOf, type RevisionDocument } from "../revision";

/** How one check of a list differs from the other list's. */
export interface ListDifference {
  key: string;
  ask: string;
  change: "added" | "removed" | "changed";
  /** The members of the check that differ, where it is on both. */
  members?: string[];
  /** The kinds of walk that now have it, no longer have it, or have it at another place, where it is on both. */
  walks?: { added: Purpose[]; removed: Purpose[]; moved: Purpose[] };
}

/** The differences between two lists: first those of the later list in its order, then what is no longer on it. */
export function listDifferences(before: RevisionDocument, after: RevisionDocument): ListDifference[] {
  const [old, now] = [checksOf(before), checksOf(after)];
  const moved = movedIn(before, after);
  const present = [...now].flatMap(([key, check]): ListDifference[] => {
    const was = old.get(key);
    if (!was) return [{ key, ask: check.ask, change: "added" }];
    const members = [...new Set([...Object.keys(was), ...Object.keys(check)])]
      .filter((member) => textOf(was, member) !== textOf(check, member))
      .sort();
    const walks = {
      added: purposes.filter((purpose) => has(after, purpose, key) && !has(before, purpose, key)),
      removed: purposes.filter((purpose) => has(before, purpose, key) && !has(after, purpose, key)),
      moved: purposes.filter((purpose) => moved[purpose].has(key)),
    };
    const walked = Object.values(walks).some((some) => some.length > 0);
    if (members.length === 0 && !walked) return [];
    return [{ key, ask: check.ask, change: "changed", members, ...(walked && { walks }) }];
  });
  const gone = [...old].flatMap(([key, { ask }]): ListDifference[] =>
    now.has(key) ? [] : [{ key, ask, change: "removed" }],
  );
  return [...present, ...gone];
}

function textOf(check: object, member: string): string | null {
  const value: unknown = (check as Record<string, unknown>)[member];
  return value === undefined ? null : canonicalText(value);
}

function has(document: RevisionDocument, purpose: Purpose, key: string): boolean {
  return document.walks[purpose].full.includes(key);
}

function movedIn(before: RevisionDocument, after: RevisionDocument): Record<Purpose, Set<string>> {
  return Object.fromEntries(
    purposes.map((purpose) => [purpose, moved(before.walks[purpose].full, after.walks[purpose].full)]),
  ) as Record<Purpose, Set<string>>;
}

/** The keys that stand at another place among those which both have: as few as explain the new order. */
function moved(before: string[], after: string[]): Set<string> {
  const common = after.filter((key) => before.includes(key));
  const stays = longestRising(common.map((key) => before.indexOf(key)));
  return new Set(common.filter((_, at) => !stays.has(at)));
}

/** The places of a longest rising run within a list of numbers. */
function longestRising(numbers: number[]): Set<number> {
  const runs: number[][] = [];
  numbers.forEach((number, at) => {
    const shorter = runs.filter((run) => numbers[run.at(-1)!]! < number);
    const longest = shorter.reduce<number[]>((best, run) => (run.length > best.length ? run : best), []);
    runs.push([...longest, at]);
  });
  return new Set(runs.reduce((best, run) => (run.length > best.length ? run : best), []));
}
