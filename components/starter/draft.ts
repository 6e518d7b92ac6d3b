import type { SegmentState, StripStation } from "@/components/tape/strip";
import { starterWords } from "@/lib/domain/messages/account";
import { STARTER, starterShape, typedWords, type Manual, type StarterAnswers } from "@/lib/domain/starter";

/** The questions in order; `page` comes only where the manual says how, and counts as part of `manual`. */
export const questions = ["hitch", "brake", "airLine", "lamps", "manual", "page", "name"] as const;
export type Question = (typeof questions)[number];

/** The questions that are answered by one tap. */
export type Choice = Exclude<Question, "page" | "name">;

/** What has been answered so far. */
export interface Draft {
  hitch?: StarterAnswers["hitch"];
  brake?: StarterAnswers["brake"];
  airLine?: "yes" | "no";
  lamps?: StarterAnswers["lamps"];
  manual?: Manual["says"];
  page: string;
  endState: string;
  name: string;
}

export const emptyDraft: Draft = { page: "", endState: "", name: starterWords.name.usual };

const asked = (draft: Draft) => questions.filter((question) => question !== "page" || draft.manual === "how");

/** The question after this one, null at the last. */
export function questionAfter(question: Question, draft: Draft): Question | null {
  const all = asked(draft);
  return all[all.indexOf(question) + 1] ?? null;
}

/** The question before this one, null at the first. */
export function questionBefore(question: Question, draft: Draft): Question | null {
  const all = asked(draft);
  return all[all.indexOf(question) - 1] ?? null;
}

/** Where a question stands, counted from 1. */
export function placeOf(question: Question): { place: number; total: number } {
  const counted = questions.filter((each) => each !== "page");
  return { place: counted.indexOf(question === "page" ? "manual" : question) + 1, total: counted.length };
}

/** The questions as tape. */
export function stripOf(question: Question): StripStation[] {
  const { place, total } = placeOf(question);
  const state = (at: number): SegmentState => (at < place ? "good" : at === place ? "now" : "todo");
  return Array.from({ length: total }, (_, at) => ({ key: String(at), segments: [state(at + 1)] }));
}

/** The answers that a finished draft comes to; null while something is missing. */
export function answersOf(draft: Draft): StarterAnswers | null {
  const { hitch, brake, airLine, lamps, manual: says } = draft;
  const manual =
    says === "how"
      ? {
          says,
          page: typedWords(draft.page, STARTER.page),
          endState: typedWords(draft.endState, STARTER.endState),
        }
      : says && { says };
  const name = typedWords(draft.name, STARTER.name);
  const parsed = starterShape.safeParse({ name, hitch, brake, lamps, airLine: airLine === "yes", manual });
  return parsed.success && airLine ? parsed.data : null;
}
