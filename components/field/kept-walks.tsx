import type { KeptWalk } from "@/lib/client/walk-shelf";
import { fieldWords } from "@/lib/domain/messages/field";
import { recentText } from "@/lib/client/time-words";
import { KeptStrip } from "./last-verdict";
import { useNowMs } from "./now";
import { useStoredWalk } from "./stored-walk";
import { VerdictMark } from "./verdict-mark";
import { nextStep, stepsOf } from "./walk-plan";
import { WingLink } from "./wing-link";

const words = fieldWords.kept;
const RECENT = 10;

/** The last walks on this phone: what each came to, and whether the server has it. */
export function KeptWalks({ walks }: { walks: readonly KeptWalk[] }) {
  return (
    <section className="border-t-hair border-rule pt-4 lg:border-t-[3px] lg:border-ink">
      <h2 className="px-4 pb-2 text-xl font-extrabold">{words.title}</h2>
      {walks.length === 0 && <p className="px-4 text-soft">{words.none}</p>}
      <ul>
        {walks.slice(0, RECENT).map((walk) => (
          <li key={walk.id} className="border-t-hair border-rule last:border-b-hair">
            <KeptRow walk={walk} />
          </li>
        ))}
      </ul>
    </section>
  );
}

function KeptRow({ walk }: { walk: KeptWalk }) {
  const nowMs = useNowMs();
  return (
    <WingLink walk={walk.id} className="block px-4 py-3 no-underline active:bg-shade">
      <span className="flex items-baseline justify-between gap-3">
        <span className="flex items-center gap-2.5 self-center">
          {walk.verdict && <VerdictMark verdict={walk.verdict} />}
          <Standing walk={walk} />
        </span>
        <span className="tabular shrink-0 text-base">{recentText(walk.openedAt, nowMs)}</span>
      </span>
      <span className="mt-0.5 flex flex-wrap justify-between gap-x-3 text-base text-soft">
        <span>{words.line(walk.purpose, walk.rigName)}</span>
        <span>{stateWords(walk)}</span>
      </span>
      <KeptStrip walk={walk} />
    </WingLink>
  );
}

function Standing({ walk }: { walk: KeptWalk }) {
  const stored = useStoredWalk(walk.seal ? undefined : walk);
  if (walk.verdict) {
    const look = walk.verdict === "hold" ? "text-hold" : "";
    return <span className={`font-extrabold ${look}`}>{fieldWords.verdict[walk.verdict]}</span>;
  }
  const steps = stored ? stepsOf(stored.document, walk) : [];
  const next = stored && nextStep(steps, stored.replay.marks, null);
  return (
    <span className="font-extrabold">
      {words.open(stored && { place: next?.place ?? null, total: steps.length })}
    </span>
  );
}

function stateWords({ receipt, refused }: KeptWalk): string {
  if (receipt) return words.received;
  return refused ? words.refused(refused) : words.saved;
}
